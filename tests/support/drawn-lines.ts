import { inflateSync } from 'node:zlib';

type Place = [x: number, y: number];
type Matrix = readonly [number, number, number, number, number, number];

/** The content of each page of a document, in the order in which they were written. */
function contentsOf(pdf: Uint8Array): string[] {
  const bytes = Buffer.from(pdf);
  const text = bytes.toString('latin1');
  return [...text.matchAll(/<<([^<>]*\/Filter \/FlateDecode[^<>]*)>>\nstream\n/g)]
    .map(({ index, 0: head, 1: about = '' }) => {
      const length = Number(/\/Length (\d+)/.exec(about)?.[1]);
      const from = index + head.length;
      return inflateSync(bytes.subarray(from, from + length)).toString('latin1');
    })
    .filter((content) => content.includes(' cm\n'));
}

function product(m: Matrix, n: Matrix): Matrix {
  const [a, b, c, d, e, f] = m;
  const [p, q, r, s, t, u] = n;
  return [a * p + b * r, a * q + b * s, c * p + d * r, c * q + d * s, e * p + f * r + t, e * q + f * s + u]; // prettier-ignore
}

function placed([x, y]: Place, [a, b, c, d, e, f]: Matrix): Place {
  return [a * x + c * y + e, b * x + d * y + f];
}

/** Straight lines of a page with their ends in points from its bottom left corner, as a reader places them. */
export function linesOfPage(pdf: Uint8Array, page = 0): { start: Place; end: Place }[] {
  const lines: { start: Place; end: Place }[] = [];
  let matrix: Matrix = [1, 0, 0, 1, 0, 0];
  const kept: Matrix[] = [];
  let at: Place = [0, 0];
  for (const row of (contentsOf(pdf)[page] ?? '').split('\n')) {
    const words = row.trim().split(/\s+/);
    const [a = 0, b = 0, c = 0, d = 0, e = 0, f = 0] = words.slice(0, -1).map(Number);
    const operator = words.at(-1);
    if (operator === 'q') kept.push(matrix);
    if (operator === 'Q') matrix = kept.pop() ?? matrix;
    if (operator === 'cm') matrix = product([a, b, c, d, e, f], matrix);
    if (operator === 'm') at = [a, b];
    if (operator === 'l') {
      lines.push({ start: placed(at, matrix), end: placed([a, b], matrix) });
      at = [a, b];
    }
  }
  return lines;
}
