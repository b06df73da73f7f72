import { RowFault } from './row-fault.ts';

type Coordinates = number | readonly Coordinates[];
type Cursor = { readonly text: string; at: number };

const NAMES: Readonly<Record<string, string>> = {
  POINT: 'Point',
  MULTIPOINT: 'MultiPoint',
  LINESTRING: 'LineString',
  MULTILINESTRING: 'MultiLineString',
  POLYGON: 'Polygon',
  MULTIPOLYGON: 'MultiPolygon',
  CURVEPOLYGON: 'Polygon',
  MULTISURFACE: 'MultiPolygon',
};
/** Brackets about the points of each kind. */
const DEPTHS: Readonly<Record<string, number>> = { Polygon: 2, MultiPolygon: 3 };
const HEAD = /^\s*(?:SRID\s*=\s*(\d{1,6})\s*;\s*)?([A-Z]{1,20})\s*(ZM|Z|M)?\s*(EMPTY\s*$|(?=\())/i;
const NUMBERS = /\s*([-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?)/iy;
const MOST_POINTS = 1_000_000;

const CURVED = /^(COMPOUNDCURVE|CIRCULARSTRING|MULTICURVE|GEOMETRYCOLLECTION|TIN|POLYHEDRALSURFACE)$/; // prettier-ignore

/** The word in front, in capitals; Z and M may be joined to it. */
function wordOf(text: string): string | undefined {
  return HEAD.exec(text.slice(0, 200))?.[2]
    ?.toUpperCase()
    .replace(/(ZM|Z|M)$/, '');
}

/** Whether a text looks like well-known text. */
export function looksLikeWkt(text: string): boolean {
  const word = wordOf(text);
  return word !== undefined && (Object.hasOwn(NAMES, word) || CURVED.test(word));
}

/** The number of the system that stands before a text, as some databases write it. */
export function sridOf(text: string): number | undefined {
  const srid = HEAD.exec(text.slice(0, 200))?.[1];
  return srid === undefined ? undefined : Number(srid);
}

function damaged({ text, at }: Cursor): RowFault {
  const found = text.slice(at, at + 12);
  const what = found === '' ? 'it ends too early' : `"${found}" is not expected`;
  return new RowFault(`Its well-known text is damaged at letter ${at + 1}: ${what}.`);
}

function skip(cursor: Cursor, letter: string): boolean {
  while (/\s/.test(cursor.text.charAt(cursor.at))) cursor.at += 1;
  if (cursor.text.charAt(cursor.at) !== letter) return false;
  cursor.at += 1;
  return true;
}

function point(cursor: Cursor): readonly number[] {
  const numbers: number[] = [];
  for (;;) {
    NUMBERS.lastIndex = cursor.at;
    const found = NUMBERS.exec(cursor.text);
    if (found === null) break;
    numbers.push(Number(found[1]));
    cursor.at = NUMBERS.lastIndex;
    if (numbers.length > 4) throw damaged(cursor);
  }
  if (numbers.length < 2) throw damaged(cursor);
  return numbers;
}

function bracket(cursor: Cursor, depth: number): readonly Coordinates[] {
  if (!skip(cursor, '(')) throw damaged(cursor);
  const all: Coordinates[] = [];
  do {
    all.push(depth === 1 ? point(cursor) : bracket(cursor, depth - 1));
    if (all.length > MOST_POINTS) throw new RowFault('It has more than a million points.');
  } while (skip(cursor, ','));
  if (!skip(cursor, ')')) throw damaged(cursor);
  return all;
}

/** Reads well-known text; only the coordinates of areas, since footprints are areas. */
export function readWkt(text: string): { readonly type: string; readonly coordinates: unknown } {
  const head = HEAD.exec(text.slice(0, 200));
  if (head === null) throw damaged({ text, at: 0 });
  const word = wordOf(text) ?? '';
  const type = NAMES[word];
  if (type === undefined) throw new RowFault(`It is a ${word}: export polygons.`);
  const depth = DEPTHS[type];
  if (depth === undefined || /EMPTY/i.test(head[4] ?? '')) return { type, coordinates: [] };
  const cursor = { text, at: head[0].length };
  if (/CURVE|CIRCULAR/i.test(text.slice(cursor.at))) {
    throw new RowFault('It has curves, which are not taken. Export polygons.');
  }
  const coordinates = bracket(cursor, depth);
  while (/\s|;/.test(text.charAt(cursor.at))) cursor.at += 1;
  if (cursor.at < text.length) throw damaged(cursor);
  return { type, coordinates };
}
