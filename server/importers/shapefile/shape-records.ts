import { AppError } from '../../errors.ts';
import { nestRings } from '../geometry/nest-rings.ts';
import { RowFault } from '../geometry/row-fault.ts';

type Point = readonly [number, number];
type Shape = { readonly type: string; readonly coordinates: unknown };

/** A record as it stands in the file. */
export type ShapeRecord = { readonly number: number; readonly content: Buffer };

const HEADING = 100;
const MARK = 9994;
const RECORD_HEADING = 8;
/** Where a line's or polygon's count of parts stands in a record, and its parts begin. */
const PARTS_AT = 36;
const FIRST_PART = 44;
/** Rings are sorted into outer ones and holes pair by pair. */
const MOST_RINGS = 5000;
const MOST_POINTS = 1_000_000;
const NULL_SHAPE = 0;
/** Plain, with heights and with measures. */
const [POINTS, LINES, AREAS] = [
  [1, 8, 11, 18, 21, 28],
  [3, 13, 23],
  [5, 15, 25],
];

function damaged(record: number): AppError {
  return new AppError('unreadable', `The shapes cannot be read: record ${record} is damaged.`);
}

/** The records of a file of shapes, each whole. */
export function* shapeRecords(shp: Buffer): Generator<ShapeRecord> {
  if (shp.length < HEADING || shp.readInt32BE(0) !== MARK) throw damaged(0);
  const claimed = 2 * shp.readInt32BE(24);
  if (claimed > shp.length) {
    throw new AppError('unreadable', 'The shapes cannot be read: the end of the file is missing.');
  }
  let number = 0;
  for (let at = HEADING; at + RECORD_HEADING < shp.length;) {
    number += 1;
    const length = 2 * shp.readInt32BE(at + 4);
    const start = at + RECORD_HEADING;
    if (length < 4 || start + length > shp.length) throw damaged(number);
    yield { number, content: shp.subarray(start, start + length) };
    at = start + length;
  }
}

/** Where each part begins; they have to follow one another and to lie in the record. */
function partStarts({ content, number }: ShapeRecord): readonly number[] {
  if (content.length < FIRST_PART) throw damaged(number);
  const parts = content.readInt32LE(PARTS_AT);
  const points = content.readInt32LE(PARTS_AT + 4);
  if (parts === 0 && points === 0) return [];
  if (parts < 1 || points < 1) throw damaged(number);
  if (FIRST_PART + 4 * parts + 16 * points > content.length) throw damaged(number);
  if (points > MOST_POINTS) throw new RowFault('It has more than a million points.');
  const starts: number[] = [];
  for (let k = 0; k < parts; k += 1) {
    const first = content.readInt32LE(FIRST_PART + 4 * k);
    if (first <= (starts.at(-1) ?? -1) || first >= points) throw damaged(number);
    starts.push(first);
  }
  return [...starts, points];
}

function partsOf(record: ShapeRecord): Point[][] {
  const { content } = record;
  const starts = partStarts(record);
  const base = FIRST_PART + 4 * (starts.length - 1);
  return starts.slice(0, -1).map((first, k) => {
    const part: Point[] = [];
    for (let point = first; point < (starts[k + 1] ?? first); point += 1) {
      const at = base + 16 * point;
      part.push([content.readDoubleLE(at), content.readDoubleLE(at + 8)]);
    }
    return part;
  });
}

function oneOrMany(type: string, parts: readonly unknown[]): Shape {
  return parts.length === 1
    ? { type, coordinates: parts[0] }
    : { type: `Multi${type}`, coordinates: parts };
}

/** A record's shape as GeoJSON has it; null for a record of none. */
export function shapeOf(record: ShapeRecord): Shape | null {
  const type = record.content.readInt32LE(0);
  if (type === NULL_SHAPE) return null;
  if (POINTS.includes(type)) return { type: 'Point', coordinates: [] };
  if (LINES.includes(type)) return oneOrMany('LineString', partsOf(record));
  if (!AREAS.includes(type)) {
    throw new RowFault(`It is a shape of kind ${type}, which is neither a line nor an area.`);
  }
  const rings = partsOf(record);
  if (rings.length > MOST_RINGS) throw new RowFault('It has more than 5,000 rings.');
  return oneOrMany('Polygon', nestRings(rings));
}
