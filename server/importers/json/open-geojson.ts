import { AppError } from '../../errors.ts';
import { flatProperties, noProperties } from '../flat-properties.ts';
import { crsOfName, WGS84 } from '../named-crs.ts';
import type { FileCrs, Source, SourceRow } from '../source.ts';
import { elements, isList, parseSpan } from './json-scan.ts';
import type { Span } from './span.ts';

const TYPES = [
  'Point',
  'MultiPoint',
  'LineString',
  'MultiLineString',
  'Polygon',
  'MultiPolygon',
  'GeometryCollection',
];

/** A whole layer may be one feature; parsed, it takes some ten times that. */
export const LARGEST_FEATURE = 20 * 1024 * 1024;
const LONGEST_CRS = 10_000;

export function isGeometryType(type: unknown): boolean {
  return typeof type === 'string' && TYPES.includes(type);
}

/** A value as an object whose members are unknown; empty where it is none. */
export function asObject(value: unknown): Readonly<Record<string, unknown>> {
  return Object.assign(noProperties(), typeof value === 'object' ? value : {});
}

function faultyRow(row: number, fault: string): SourceRow {
  return { row, geometry: null, fault, properties: noProperties() };
}

function rowOf(bytes: Buffer, span: Span, row: number): SourceRow {
  if (span.end - span.start > LARGEST_FEATURE) {
    return faultyRow(row, 'It is larger than 20 MB: a footprint has at most 10,000 corners.');
  }
  const value = parseSpan(bytes, span);
  const { type, id, geometry, properties } = asObject(value);
  if (isGeometryType(type)) {
    return { row, geometry: value, fault: null, properties: noProperties() };
  }
  if (type !== 'Feature') return faultyRow(row, 'It is not a Feature of GeoJSON.');
  const own = typeof id === 'string' || typeof id === 'number' ? { id } : undefined;
  return { row, geometry, fault: null, properties: flatProperties(properties, own) };
}

function* rowsOf(bytes: Buffer, spans: Iterable<Span>): Generator<SourceRow> {
  let row = 0;
  for (const span of spans) {
    row += 1;
    yield rowOf(bytes, span, row);
  }
}

/** The old `crs` member, in each of the ways in which it was written. */
async function crsOf(bytes: Buffer, span: Span | undefined): Promise<FileCrs | null> {
  if (span === undefined) return WGS84;
  if (span.end - span.start > LONGEST_CRS) {
    throw new AppError('unreadable', 'The `crs` of the file is far too long to name a system.');
  }
  const { type, properties } = asObject(parseSpan(bytes, span));
  const { name, code } = asObject(properties);
  if (typeof name === 'string') return crsOfName(name.slice(0, 200));
  const isNumber = type === 'EPSG' && (typeof code === 'number' || typeof code === 'string');
  return isNumber ? crsOfName(`EPSG:${code}`) : null;
}

function source(crs: FileCrs | null, rows: Source['rows']): Source {
  return {
    format: 'geojson',
    kind: 'footprints',
    layer: null,
    crs,
    notes: [],
    columns: [],
    rows,
  };
}

/** A FeatureCollection, read feature by feature. */
export async function openCollection(
  bytes: Buffer,
  top: ReadonlyMap<string, Span>,
): Promise<Source> {
  const features = top.get('features');
  if (features === undefined || !isList(bytes, features.start)) {
    throw new AppError(
      'unreadable',
      'The file is not a FeatureCollection of GeoJSON: it has no list of features.',
    );
  }
  const crs = await crsOf(bytes, top.get('crs'));
  return source(crs, () => rowsOf(bytes, elements(bytes, features)));
}

/** Features or geometries that stand alone, one or one after another. */
export function openFeatures(bytes: Buffer, values: () => Iterable<Span>): Source {
  return source(WGS84, () => rowsOf(bytes, values()));
}
