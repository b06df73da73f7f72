import { setImmediate } from 'node:timers/promises';
import { parse } from 'csv-parse';
import { z } from 'zod';
import { GROUND_LIMITS } from '../../shared/schemas/ground.ts';
import { AppError } from '../errors.ts';
import { betweenGrids } from './grid-place.ts';
import type { Spots } from './ground.ts';
import { isLevel } from './level-range.ts';
import { readNumber } from './read-number.ts';
import { createRowFaults, quoted } from './row-faults.ts';

const DEGREES = 4326;
const AT_ONCE = 20_000;
const LONGEST_LINE = 100_000;

/** What columns are called, without units and signs. */
const NAMES = {
  x: ['x', 'e', 'east', 'easting', 'eastings'],
  y: ['y', 'n', 'north', 'northing', 'northings'],
  longitude: ['lon', 'long', 'lng', 'longitude'],
  latitude: ['lat', 'latitude'],
  level: ['z', 'level', 'elevation', 'elev', 'height', 'h', 'rl', 'ground level', 'groundlevel'],
} as const;

type Columns = {
  /** As the file calls them. */
  readonly names: readonly string[];
  readonly x: number;
  readonly y: number;
  readonly level: number;
  readonly isDegrees: boolean;
};

const rowSchema = z.array(z.string());

function unreadable(message: string): AppError {
  return new AppError('unreadable', message);
}

function columnsOf(heading: readonly string[]): Columns {
  const names = heading.map((name) =>
    name
      .replace(/[([].*$/, '')
      .replaceAll('_', ' ')
      .trim()
      .toLowerCase(),
  );
  const find = (wanted: readonly string[]) => names.findIndex((name) => wanted.includes(name));
  const [x, y, level] = [find(NAMES.x), find(NAMES.y), find(NAMES.level)];
  const [longitude, latitude] = [find(NAMES.longitude), find(NAMES.latitude)];
  if (level >= 0 && x >= 0 && y >= 0) return { names: heading, x, y, level, isDegrees: false };
  if (level >= 0 && longitude >= 0 && latitude >= 0) {
    return { names: heading, x: longitude, y: latitude, level, isDegrees: true };
  }
  throw unreadable(
    'Name the columns in the first line: x, y and z; easting, northing and level; or lon, lat and level.',
  );
}

function separatorOf(text: string): string {
  const [line = ''] = text.slice(0, LONGEST_LINE).split(/\r?\n/, 1);
  const counts = [';', '\t', ','].map(
    (separator) => [separator, line.split(separator).length] as const,
  );
  return counts.reduce((best, one) => (one[1] > best[1] ? one : best))[0];
}

async function* rowsOf(text: string): AsyncGenerator<string[]> {
  const options = { bom: true, delimiter: separatorOf(text), relax_column_count: true };
  const rows: AsyncIterable<unknown> = parse(text, {
    ...options,
    skip_empty_lines: true,
    max_record_size: LONGEST_LINE,
  });
  try {
    for await (const row of rows) yield rowSchema.parse(row);
  } catch (error) {
    if (error instanceof AppError) throw error;
    throw unreadable('The file cannot be read as CSV. Check its quotation marks.');
  }
}

async function placeOf({ isDegrees }: Columns, crs: number | undefined, scheme: number) {
  const from = crs ?? (isDegrees ? DEGREES : scheme);
  return betweenGrids(from, scheme);
}

type Place = Awaited<ReturnType<typeof placeOf>>;

/** A row as a point, or why it is none. */
function pointOf(row: readonly string[], columns: Columns, place: Place): number[] | string {
  const { x, y, level } = columns;
  for (const column of [x, y, level]) {
    const word = row[column]?.trim() ?? '';
    const name = `column ${quoted(columns.names[column]?.trim() ?? '')}`;
    if (word === '') return `${name} is blank.`;
    if (Number.isNaN(readNumber(word))) return `${quoted(word)} in ${name} is not a number.`;
  }
  const [east, north, height] = [x, y, level].map((column) => readNumber(row[column] ?? ''));
  const [onEast, onNorth] = place([east ?? NaN, north ?? NaN]);
  if (!Number.isFinite(onEast + onNorth)) return 'the point cannot be placed in the grid.';
  if (!isLevel(height ?? NaN)) return `no ground lies at ${String(height)} m. Check the units.`;
  return [onEast, onNorth, height ?? NaN];
}

/** Reads spot heights from CSV, brought to the scheme's grid. */
export async function readSpots(
  bytes: Buffer,
  { crs, schemeCrs }: { readonly crs: number | undefined; readonly schemeCrs: number },
): Promise<Spots> {
  const text = bytes.toString('utf8');
  const points: number[] = [];
  let columns: Columns | undefined;
  let place: Place | undefined;
  const faults = createRowFaults();
  let line = 0;
  for await (const row of rowsOf(text)) {
    line += 1;
    if (columns === undefined || place === undefined) {
      columns = columnsOf(row);
      place = await placeOf(columns, crs, schemeCrs);
      continue;
    }
    if (line > GROUND_LIMITS.spots + 1) {
      throw new AppError('too-large', 'The file holds more than 500,000 points.');
    }
    const point = pointOf(row, columns, place);
    if (typeof point === 'string') faults.add(`Row ${line}`, point);
    else points.push(...point);
    if (line % AT_ONCE === 0) await setImmediate();
  }
  faults.refuse();
  if (points.length === 0) throw unreadable('The file holds no points.');
  return { kind: 'spots', points: Float64Array.from(points) };
}
