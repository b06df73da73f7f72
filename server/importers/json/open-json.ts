import { AppError } from '../../errors.ts';
import { openCityjson } from '../cityjson/open-cityjson.ts';
import { openCityjsonLines } from '../cityjson/open-cityjson-lines.ts';
import type { Source } from '../source.ts';
import { utf8Bytes } from '../text-bytes.ts';
import { isGeometryType, openCollection, openFeatures } from './open-geojson.ts';
import { jsonRefusal } from './json-refusal.ts';
import { isObject, members, parseSpan, skipWhite, valueAt } from './json-scan.ts';
import type { Span } from './span.ts';

type TopMembers = ReadonlyMap<string, Span>;

const MOST_MEMBERS = 1000;
const LONGEST_TYPE = 100;
/** Stands before every value of a sequence that is written by the book. */
const RECORD_MARK = 0x1e;

function skipMarks(bytes: Buffer, start: number): number {
  const at = skipWhite(bytes, start);
  return bytes[at] === RECORD_MARK ? skipMarks(bytes, at + 1) : at;
}

/** The members of an object, none of them parsed, and where the object ends. */
function topMembers(bytes: Buffer, start: number): { top: TopMembers; end: number } {
  const top = new Map<string, Span>();
  let last = start + 1;
  for (const { key, ...span } of members(bytes, { start })) {
    top.set(key, span);
    last = span.end;
    if (top.size > MOST_MEMBERS) {
      throw new AppError('unreadable', 'The file is one object with thousands of members.');
    }
  }
  return { top, end: skipWhite(bytes, last) + 1 };
}

function typeOf(bytes: Buffer, top: TopMembers): string | undefined {
  const span = top.get('type');
  if (span === undefined || span.end - span.start > LONGEST_TYPE) return undefined;
  const type = parseSpan(bytes, span);
  return typeof type === 'string' ? type : undefined;
}

function refusal(type: string | undefined, top: TopMembers): AppError {
  const is = 'The file is not a FeatureCollection of GeoJSON';
  if (type === 'Topology') {
    return new AppError('unreadable', `${is}: it seems to be TopoJSON. Save it as GeoJSON.`);
  }
  if (top.has('features') && (top.has('geometryType') || top.has('spatialReference'))) {
    return new AppError('unreadable', `${is}: it seems to be Esri JSON. Save it as GeoJSON.`);
  }
  return new AppError('unreadable', `${is}, nor CityJSON.`);
}

/** The values of a file one after another: one, or many where each stands on a line of its own. */
function* valuesOf(bytes: Buffer): Generator<Span> {
  for (let at = skipMarks(bytes, 0); at < bytes.length;) {
    const value = valueAt(bytes, at);
    yield value;
    at = skipMarks(bytes, value.end);
  }
}

/** Reads JSON by what it holds, whatever the file is called. */
export async function openJson(given: Buffer): Promise<Source> {
  const bytes = utf8Bytes(given);
  const start = skipMarks(bytes, 0);
  if (!isObject(bytes, start)) {
    valueAt(bytes, start); // what is nested too deep is told so
    throw refusal(undefined, new Map());
  }
  const { top, end } = topMembers(bytes, start);
  const type = typeOf(bytes, top);
  const next = skipMarks(bytes, end);
  const isAlone = next >= bytes.length;
  const values = () => valuesOf(bytes);
  if (type === 'CityJSON' && !isAlone) return openCityjsonLines(bytes, values, top);
  if (type === 'Feature' || isGeometryType(type)) return openFeatures(bytes, values);
  if (!isAlone) throw jsonRefusal(bytes, next, 'more text follows its end');
  if (type === 'CityJSON') return openCityjson(bytes, top);
  if (type === 'FeatureCollection') return openCollection(bytes, top);
  throw refusal(type, top);
}
