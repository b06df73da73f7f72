import { z } from 'zod';
import { AppError } from '../../errors.ts';
import { elements, parseSpan } from '../json/json-scan.ts';
import type { Span } from '../json/span.ts';
import { RowFault } from '../geometry/row-fault.ts';

/** A vertex by its number, in the file's system. */
export type Vertices = (index: number) => readonly [number, number, number];

const AT_ONCE = 20_000;
const MOST = 20_000_000;
const triple = z.tuple([z.number(), z.number(), z.number()]);
const transformSchema = z.object({ scale: triple, translate: triple });

export type Transform = z.infer<typeof transformSchema>;
const NO_TRANSFORM: Transform = { scale: [1, 1, 1], translate: [0, 0, 0] };

function damaged(what: string): AppError {
  return new AppError('unreadable', `The CityJSON cannot be read: ${what}.`);
}

/** How the whole numbers of vertices become coordinates; the oldest files have none. */
export function readTransform(value: unknown): Transform {
  if (value === undefined) return NO_TRANSFORM;
  const { data } = transformSchema.safeParse(value);
  if (data === undefined) throw damaged('its transform is no scale and translation');
  return data;
}

/** Vertices that are parsed already, in one row of numbers; a schema would take long for millions. */
export function listedVertices(given: unknown): Float64Array {
  const list: readonly unknown[] | undefined = Array.isArray(given) ? given : undefined;
  if (list === undefined) throw damaged('its vertices are no list');
  const numbers = new Float64Array(3 * list.length);
  for (const [index, vertex] of list.entries()) {
    const triplet: readonly unknown[] = Array.isArray(vertex) ? vertex : [];
    const [x, y, z] = triplet;
    if (typeof x !== 'number' || typeof y !== 'number' || typeof z !== 'number') {
      throw damaged(`vertex ${index} of a list is not three numbers`);
    }
    numbers.set([x, y, z], 3 * index);
  }
  return numbers;
}

/** The vertices in a list, packed so that millions of them take little room. */
export function packedVertices(bytes: Buffer, list: Span): Float64Array {
  const parts: Float64Array[] = [];
  let [count, waiting] = [0, 0];
  let first: Span | undefined;
  const take = (end: number) => {
    if (first === undefined) return;
    const text = `[${bytes.toString('utf8', first.start, end)}]`;
    const span = { start: 0, end: Buffer.byteLength(text) };
    parts.push(listedVertices(parseSpan(Buffer.from(text), span)));
    [first, waiting] = [undefined, 0];
  };
  let end = 0;
  for (const span of elements(bytes, list)) {
    if (waiting === AT_ONCE) take(end);
    first ??= span;
    [count, waiting, end] = [count + 1, waiting + 1, span.end];
    if (count > MOST) throw new AppError('too-large', 'The file holds too many vertices.');
  }
  take(end);
  const all = new Float64Array(3 * count);
  let at = 0;
  for (const part of parts) {
    all.set(part, at);
    at += part.length;
  }
  return all;
}

export function placedVertices(numbers: Float64Array, { scale, translate }: Transform): Vertices {
  return (index) => {
    const [x, y, z] = [numbers[3 * index], numbers[3 * index + 1], numbers[3 * index + 2]];
    if (x === undefined || y === undefined || z === undefined) {
      throw new RowFault('It has a corner that is not among the vertices of the file.');
    }
    return [x * scale[0] + translate[0], y * scale[1] + translate[1], z * scale[2] + translate[2]];
  };
}
