import type { LineString, MultiLineString, MultiPolygon, Polygon } from 'geojson';
import { z } from 'zod';
import type { BackgroundLayer } from '../../shared/schemas/background.ts';
import { RowFault } from './geometry/row-fault.ts';
import type { Place } from './place-of-crs.ts';

export type DrawnGeometry = LineString | MultiLineString | Polygon | MultiPolygon;
type Position = [number, number];

const LINES = ['LineString', 'MultiLineString'];
const AREAS = ['Polygon', 'MultiPolygon'];

/** What each layer takes. */
const TAKES: Readonly<Record<BackgroundLayer, { what: string; types: readonly string[] }>> = {
  streets: { what: 'lines', types: LINES },
  rail: { what: 'lines', types: LINES },
  water: { what: 'lines and areas', types: [...LINES, ...AREAS] },
  parks: { what: 'areas', types: AREAS },
};

const geometrySchema = z.object({ type: z.string(), coordinates: z.unknown() });

function list(value: unknown): readonly unknown[] {
  if (!Array.isArray(value) || value.length === 0) throw new RowFault('It has no points.');
  return value;
}

function position(value: unknown, place: Place): Position {
  const [x, y]: readonly unknown[] = list(value);
  if (typeof x !== 'number' || typeof y !== 'number' || !Number.isFinite(x + y)) {
    throw new RowFault('It has a point that is not two numbers.');
  }
  const [longitude, latitude] = place([x, y]);
  if (!(Math.abs(longitude) <= 180 && Math.abs(latitude) <= 90)) {
    throw new RowFault('It is not on the map: check which grid the file is in.');
  }
  return [longitude, latitude];
}

function line(value: unknown, place: Place): Position[] {
  const points = list(value).map((one) => position(one, place));
  if (points.length < 2) throw new RowFault('It has a line of one point.');
  return points;
}

function ring(value: unknown, place: Place): Position[] {
  const points = line(value, place);
  const [first, last] = [points[0], points.at(-1)];
  if (first && last && (first[0] !== last[0] || first[1] !== last[1])) points.push([...first]);
  if (points.length < 4) throw new RowFault('It has a ring of fewer than three corners.');
  return points;
}

function rings(value: unknown, place: Place): Position[][] {
  return list(value).map((one) => ring(one, place));
}

/** A geometry of a layer in longitude and latitude, or a RowFault. */
export function drawnGeometry(value: unknown, layer: BackgroundLayer, place: Place): DrawnGeometry {
  const geometry = geometrySchema.safeParse(value);
  if (!geometry.success) throw new RowFault('It has no geometry.');
  const { type, coordinates: given } = geometry.data;
  const { what, types } = TAKES[layer];
  if (!types.includes(type)) throw new RowFault(`It is a ${type}: the layer takes ${what}.`);
  switch (type) {
    case 'LineString':
      return { type, coordinates: line(given, place) };
    case 'MultiLineString':
      return { type, coordinates: list(given).map((one) => line(one, place)) };
    case 'Polygon':
      return { type, coordinates: rings(given, place) };
    default:
      return { type: 'MultiPolygon', coordinates: list(given).map((one) => rings(one, place)) };
  }
}
