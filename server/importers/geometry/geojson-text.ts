import { z } from 'zod';
import { codeOfName } from '../named-crs.ts';
import { RowFault } from './row-fault.ts';

const BEGINS = /^\s*\{/;
const TYPE = /"type"\s*:\s*"(Polygon|MultiPolygon|Point|MultiPoint|LineString|MultiLineString|GeometryCollection|Feature)"/; // prettier-ignore
const CRS = /"crs"\s*:\s*\{[^{}]{0,200}\{\s*"name"\s*:\s*"([^"]{1,200})"/;
/** A geometry opens a bracket or two, and its system some more. */
const MOST_BRACKETS = 100;

const featureSchema = z.object({ type: z.literal('Feature'), geometry: z.unknown() });

/** Whether a text of a table holds a geometry of GeoJSON. */
export function looksLikeGeojson(text: string): boolean {
  return BEGINS.test(text) && TYPE.test(text);
}

/** The number of the system that it names, as databases write it into a geometry. */
export function sridOfGeojson(text: string): number | undefined {
  return codeOfName(CRS.exec(text)?.[1] ?? '');
}

/** Reads a geometry of GeoJSON, or throws a RowFault. */
export function readGeojsonText(text: string): unknown {
  if (text.split('{').length > MOST_BRACKETS) throw new RowFault('Its GeoJSON is nested too deep.');
  try {
    const value: unknown = JSON.parse(text);
    const feature = featureSchema.safeParse(value);
    return feature.success ? feature.data.geometry : value;
  } catch {
    throw new RowFault('Its GeoJSON is damaged: it may be cut off.');
  }
}
