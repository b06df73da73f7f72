import { execFileSync } from 'node:child_process';

function outputOf(program: string, args: readonly string[], pdf: Uint8Array): Buffer {
  return execFileSync(program, [...args], { input: pdf, maxBuffer: 256 << 20 });
}

function run(program: string, args: readonly string[], pdf: Uint8Array): string {
  return outputOf(program, args, pdf).toString('utf8');
}

/** The first page of a document as a picture in greys, a portable grey map. */
export function greyPictureOfPdf(pdf: Uint8Array, dotsPerInch: number): Buffer {
  return outputOf('pdftoppm', ['-gray', '-r', String(dotsPerInch), '-singlefile', '-'], pdf);
}

/** The words of a document as anyone can copy them out of it, page by page. */
export function pagesOfPdf(pdf: Uint8Array): string[] {
  return run('pdftotext', ['-layout', '-', '-'], pdf).split('\f').slice(0, -1);
}

/** All words of a document with single spaces between them. */
export function textOfPdf(pdf: Uint8Array): string {
  return run('pdftotext', ['-raw', '-', '-'], pdf).replaceAll(/\s+/g, ' ');
}

type WordBox = {
  readonly word: string;
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
};

/** Every word with where it stands on its page, in points. */
export function wordBoxesOfPdf(pdf: Uint8Array): WordBox[] {
  const html = run('pdftotext', ['-bbox', '-', '-'], pdf);
  const pattern =
    /<word xMin="([\d.-]+)" yMin="([\d.-]+)" xMax="([\d.-]+)" yMax="([\d.-]+)">(.*?)<\/word>/g;
  return [...html.matchAll(pattern)].map(([, left, top, right, bottom, word = '']) => ({
    word,
    ...{ left: Number(left), top: Number(top), right: Number(right), bottom: Number(bottom) },
  }));
}

/** What a document says of itself, name by name. */
export function factsOfPdf(pdf: Uint8Array): Record<string, string> {
  const lines = run('pdfinfo', ['-'], pdf).trim().split('\n');
  return Object.fromEntries(
    lines.map((line) => {
      const [name = '', ...rest] = line.split(':');
      return [name, rest.join(':').trim()];
    }),
  );
}

/** The fonts of a document: whether each is embedded, and whether its letters can be read out. */
export function fontsOfPdf(
  pdf: Uint8Array,
): { name: string; isEmbedded: boolean; isReadable: boolean }[] {
  const rows = run('pdffonts', ['-'], pdf).trim().split('\n').slice(2);
  return rows.map((row) => {
    const [embedded, , readable] = row
      .slice(row.search(/\s(yes|no)\s/))
      .trim()
      .split(/\s+/);
    return {
      name: row.split(' ')[0] ?? '',
      isEmbedded: embedded === 'yes',
      isReadable: readable === 'yes',
    };
  });
}

/** The titles of a document's bookmarks, in order. */
export function bookmarksOfPdf(pdf: Uint8Array): string[] {
  const text = Buffer.from(pdf).toString('latin1');
  return [...text.matchAll(/\/Parent \d+ 0 R\n\/Title \(([^)]*)\)/g)].map(
    ([, title = '']) => title,
  );
}
