import { RowFault } from './row-fault.ts';

type Geometry =
  | { readonly type: string; readonly coordinates: unknown }
  | { readonly type: 'GeometryCollection'; readonly geometries: readonly Geometry[] };
type Cursor = { readonly bytes: Buffer; at: number; readonly depth: number };
type Heading = {
  readonly type: number;
  readonly numbers: number;
  readonly isLittle: boolean;
};

const POINTS = 1_000_000;
const DEEPEST = 5;
/** How some databases mark heights, measures and a number of the system. */
const [HAS_Z, HAS_M, HAS_SRID] = [0x80000000, 0x40000000, 0x20000000];
const PLAIN = ['', 'Point', 'LineString', 'Polygon', 'MultiPoint', 'MultiLineString', 'MultiPolygon', 'GeometryCollection']; // prettier-ignore
/** Those that may hold curves, and often hold none, by what they are then. */
const STRAIGHT: Readonly<Record<number, 'LineString' | 'Polygon' | 'MultiLineString' | 'MultiPolygon'>> = { 9: 'LineString', 10: 'Polygon', 11: 'MultiLineString', 12: 'MultiPolygon' }; // prettier-ignore

function damaged(): RowFault {
  return new RowFault('Its geometry is damaged.');
}

function uint32(cursor: Cursor, isLittle: boolean): number {
  const { bytes, at } = cursor;
  if (at + 4 > bytes.length) throw damaged();
  cursor.at += 4;
  return isLittle ? bytes.readUInt32LE(at) : bytes.readUInt32BE(at);
}

function headingOf(cursor: Cursor): Heading {
  const order = cursor.bytes[cursor.at];
  if (order !== 0 && order !== 1) throw damaged();
  cursor.at += 1;
  const isLittle = order === 1;
  const word = uint32(cursor, isLittle);
  if ((word & HAS_SRID) !== 0) uint32(cursor, isLittle);
  const number = word & 0x0fffffff;
  const [kind, type] = [Math.floor(number / 1000), number % 1000];
  const flags = ((word & HAS_Z) === 0 ? 0 : 1) + ((word & HAS_M) === 0 ? 0 : 1);
  const more = [0, 1, 1, 2][kind];
  if (more === undefined) throw damaged();
  return { type, numbers: 2 + Math.max(flags, more), isLittle };
}

/** How many follow, of at least so many bytes each: more than there is room for is damage. */
function count(cursor: Cursor, isLittle: boolean, bytesEach: number): number {
  const many = uint32(cursor, isLittle);
  if (many * bytesEach > cursor.bytes.length - cursor.at) throw damaged();
  if (many > POINTS) throw new RowFault('It has more than a million points.');
  return many;
}

function point(cursor: Cursor, { numbers, isLittle }: Heading): [number, number] {
  const { bytes, at } = cursor;
  if (at + 8 * numbers > bytes.length) throw damaged();
  cursor.at += 8 * numbers;
  return isLittle
    ? [bytes.readDoubleLE(at), bytes.readDoubleLE(at + 8)]
    : [bytes.readDoubleBE(at), bytes.readDoubleBE(at + 8)];
}

function times<T>(many: number, read: () => T): T[] {
  const all: T[] = [];
  for (let k = 0; k < many; k += 1) all.push(read());
  return all;
}

function line(cursor: Cursor, heading: Heading): [number, number][] {
  const many = count(cursor, heading.isLittle, 8 * heading.numbers);
  return times(many, () => point(cursor, heading));
}

function membersOf(cursor: Cursor, { isLittle }: Heading): Geometry[] {
  if (cursor.depth >= DEEPEST) throw damaged();
  const inner = { ...cursor, depth: cursor.depth + 1 };
  const many = count(inner, isLittle, 5);
  const all = times(many, () => geometryAt(inner));
  cursor.at = inner.at;
  return all;
}

function coordinatesOf(all: readonly Geometry[]): unknown[] {
  return all.map((one) => ('coordinates' in one ? one.coordinates : undefined));
}

/** What may hold curves: each of its members tells its kind, and is refused where it is one. */
function straightAt(cursor: Cursor, heading: Heading, type: string): Geometry {
  const members = coordinatesOf(membersOf(cursor, heading));
  // pieces of one line, end to end
  return { type, coordinates: type === 'LineString' ? members.flat() : members };
}

function geometryAt(cursor: Cursor): Geometry {
  const heading = headingOf(cursor);
  const straight = STRAIGHT[heading.type];
  if (straight !== undefined) return straightAt(cursor, heading, straight);
  const type = PLAIN[heading.type] ?? '';
  switch (type) {
    case 'Point':
      return { type, coordinates: point(cursor, heading) };
    case 'LineString':
      return { type, coordinates: line(cursor, heading) };
    case 'Polygon': {
      const many = count(cursor, heading.isLittle, 4);
      return { type, coordinates: times(many, () => line(cursor, heading)) };
    }
    case '':
      throw new RowFault('It has curves or faces in space, which are not taken. Export polygons.');
    case 'GeometryCollection':
      return { type, geometries: membersOf(cursor, heading) };
    default:
      return { type, coordinates: coordinatesOf(membersOf(cursor, heading)) };
  }
}

/** Reads a geometry in well-known binary, plain or with heights, measures and marks of databases. */
export function readWkb(bytes: Buffer): Geometry {
  return geometryAt({ bytes, at: 0, depth: 0 });
}

/** The number of the system that stands in a geometry as some databases mark it. */
export function sridOfWkb(bytes: Buffer): number | undefined {
  const isLittle = bytes[0] === 1;
  if (bytes.length < 9) return undefined;
  const word = isLittle ? bytes.readUInt32LE(1) : bytes.readUInt32BE(1);
  if ((word & HAS_SRID) === 0) return undefined;
  return isLittle ? bytes.readUInt32LE(5) : bytes.readUInt32BE(5);
}
