import { AppError } from '../../errors.ts';
import { asObject, LARGEST_FEATURE } from '../json/open-geojson.ts';
import { isList, isObject, members, parseSpan } from '../json/json-scan.ts';
import type { Span } from '../json/span.ts';
import { crsOfName } from '../named-crs.ts';
import type { FileCrs, Source, SourceRow } from '../source.ts';
import { readCityObject, type CityObject } from './city-objects.ts';
import { cityRow, isOneRow } from './city-rows.ts';
import { packedVertices, placedVertices, readTransform, type Transform } from './vertices.ts';

type TopMembers = ReadonlyMap<string, Span>;

const LONGEST_MEMBER = 1024 * 1024;
const MOST_OBJECTS = 2_000_000;

function unreadable(what: string): AppError {
  return new AppError('unreadable', `The CityJSON cannot be read: ${what}.`);
}

function smallMember(bytes: Buffer, top: TopMembers, name: string): unknown {
  const span = top.get(name);
  if (span === undefined) return undefined;
  if (span.end - span.start > LONGEST_MEMBER) throw unreadable(`its ${name} is far too long`);
  return parseSpan(bytes, span);
}

/** What the heading of a file of cities says: where it is and how its vertices are written. */
export async function readHeading(
  bytes: Buffer,
  top: TopMembers,
): Promise<{ crs: FileCrs | null; transform: Transform }> {
  const version = smallMember(bytes, top, 'version');
  if (typeof version !== 'string' || !/^[12]\.\d/.test(version)) {
    const said = typeof version === 'string' ? `"${version.slice(0, 20)}"` : 'not said';
    throw unreadable(`its version is ${said}, and versions 1.0 to 2.0 are taken`);
  }
  const { referenceSystem } = asObject(smallMember(bytes, top, 'metadata'));
  const transform = readTransform(smallMember(bytes, top, 'transform'));
  const isNamed = typeof referenceSystem === 'string';
  return { crs: isNamed ? await crsOfName(referenceSystem.slice(0, 200)) : null, transform };
}

/** Where each object stands, so that a building finds its parts. */
function objectIndex(bytes: Buffer, objects: Span): ReadonlyMap<string, Span> {
  const index = new Map<string, Span>();
  for (const { key, start, end } of members(bytes, objects)) {
    index.set(key, { start, end });
    if (index.size > MOST_OBJECTS) {
      throw new AppError('too-large', 'The file holds more than two million objects.');
    }
  }
  return index;
}

function objectAt(bytes: Buffer, span: Span | undefined): CityObject | undefined {
  if (span === undefined || span.end - span.start > LARGEST_FEATURE) return undefined;
  return readCityObject(parseSpan(bytes, span));
}

function* rowsOf(
  bytes: Buffer,
  { objects, list }: { readonly objects: Span; readonly list: Span },
  transform: Transform,
): Generator<SourceRow> {
  const index = objectIndex(bytes, objects);
  const vertices = placedVertices(packedVertices(bytes, list), transform);
  const find = (id: string) => objectAt(bytes, index.get(id));
  let row = 0;
  for (const [id, span] of index) {
    const object = objectAt(bytes, span);
    if (object === undefined)
      throw unreadable(`its object "${id.slice(0, 100)}" is no city object`);
    if (!isOneRow(object)) continue;
    row += 1;
    yield cityRow(row, id, object, { find, vertices });
  }
}

export function cityjsonSource(crs: FileCrs | null, rows: Source['rows']): Source {
  return { format: 'cityjson', kind: 'footprints', layer: null, crs, notes: [], columns: [], rows };
}

/** Reads the buildings of a CityJSON file object by object. */
export async function openCityjson(bytes: Buffer, top: TopMembers): Promise<Source> {
  const { crs, transform } = await readHeading(bytes, top);
  const [objects, list] = [top.get('CityObjects'), top.get('vertices')];
  if (objects === undefined || !isObject(bytes, objects.start))
    throw unreadable('it has no CityObjects');
  if (list === undefined || !isList(bytes, list.start)) throw unreadable('it has no vertices');
  return cityjsonSource(crs, () => rowsOf(bytes, { objects, list }, transform));
}
