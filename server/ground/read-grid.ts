import { setImmediate } from 'node:timers/promises';
import { GROUND_LIMITS } from '../../shared/schemas/ground.ts';
import { AppError } from '../errors.ts';
import type { Grid } from './ground.ts';
import { readNumber } from './read-number.ts';
import { createRowFaults, quoted } from './row-faults.ts';

const KEYS = new Set([
  ...['ncols', 'nrows', 'xllcorner', 'xllcenter', 'yllcorner', 'yllcenter', 'cellsize'],
  ...['dx', 'dy', 'nodata_value'],
]);
const HEADING = /^\s*([a-z_]+)[ \t]+(\S+)[ \t]*(?:\r?\n|\r|$)/i;
/** No heading is longer. */
const LONGEST_HEADING = 4096;
const AT_ONCE = 200_000;
const SPACE = 32;
/** Longer is no number. */
const LONGEST_WORD = 40;

function unreadable(message: string): AppError {
  return new AppError('unreadable', message);
}

type Heading = { readonly values: ReadonlyMap<string, number>; readonly end: number };

function headingOf(bytes: Buffer): Heading {
  const values = new Map<string, number>();
  let end = bytes.toString('latin1', 0, 3) === '\u00ef\u00bb\u00bf' ? 3 : 0;
  for (;;) {
    const found = HEADING.exec(bytes.toString('latin1', end, end + LONGEST_HEADING));
    const key = found?.[1]?.toLowerCase() ?? '';
    if (found === null || !KEYS.has(key)) return { values, end };
    if (values.has(key)) throw unreadable(`The heading gives ${key} twice.`);
    const value = readNumber(found[2] ?? '');
    if (!Number.isFinite(value)) throw unreadable(`In the heading, ${key} is not a number.`);
    values.set(key, value);
    end += found[0].length;
  }
}

/** Whether a file begins like an ASCII grid. */
export function isGrid(bytes: Buffer): boolean {
  return headingOf(bytes).values.size > 0;
}

function sizeOf(values: ReadonlyMap<string, number>): Omit<Grid, 'levels' | 'crs' | 'kind'> {
  const needed = (key: string): number => {
    const value = values.get(key);
    if (value === undefined) throw unreadable(`The heading does not give ${key}.`);
    return value;
  };
  const [columns, rows] = [needed('ncols'), needed('nrows')];
  const width = values.get('dx') ?? needed('cellsize');
  const height = values.get('dy') ?? needed('cellsize');
  const isCounted = Number.isInteger(columns) && Number.isInteger(rows) && columns > 0 && rows > 0;
  if (!isCounted || !(width > 0) || !(height > 0)) {
    throw unreadable('The heading gives a grid of no size.');
  }
  if (columns * rows > GROUND_LIMITS.cells) {
    throw new AppError('too-large', 'The grid has more than 25,000,000 cells.');
  }
  const from = (axis: 'x' | 'y', size: number) =>
    values.get(`${axis}llcenter`) ?? needed(`${axis}llcorner`) + size / 2;
  return { columns, rows, width, height, west: from('x', width), south: from('y', height) };
}

type Cells = { readonly columns: number; readonly rows: number; readonly none: number };

async function readLevels(bytes: Buffer, start: number, { columns, rows, none }: Cells) {
  const count = columns * rows;
  const levels = new Float32Array(count);
  const faults = createRowFaults();
  let [at, read] = [start, 0];
  for (;;) {
    while (at < bytes.length && (bytes[at] ?? 0) <= SPACE) at += 1;
    if (at >= bytes.length) break;
    let end = at;
    while (end < bytes.length && (bytes[end] ?? 0) > SPACE) end += 1;
    // a word as long as a file is no number
    const word = bytes.toString('latin1', at, Math.min(end, at + LONGEST_WORD));
    const value = readNumber(word);
    if (Number.isNaN(value) && !/^nan$/i.test(word)) {
      const place = `Row ${Math.floor(read / columns) + 1}, column ${(read % columns) + 1}`;
      faults.add(place, `${quoted(word)} is not a number.`);
    }
    if (read === count) throw unreadable('The grid holds more values than its heading says.');
    levels[read] = value === none ? NaN : value;
    read += 1;
    at = end;
    if (read % AT_ONCE === 0) await setImmediate();
  }
  faults.refuse();
  if (read < count) {
    throw unreadable(`The grid holds ${read} values, but its heading says ${count}.`);
  }
  return levels;
}

/** Reads an ASCII grid, its heading in any order. */
export async function readGrid(bytes: Buffer, crs: number | undefined): Promise<Grid> {
  const { values, end } = headingOf(bytes);
  const size = sizeOf(values);
  const none = values.get('nodata_value') ?? -9999;
  const levels = await readLevels(bytes, end, { ...size, none });
  return { kind: 'grid', ...size, crs: crs ?? null, levels };
}
