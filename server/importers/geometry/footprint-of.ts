import { IMPORT_LIMITS } from '../../../shared/schemas/imports.ts';
import type { FootprintRings } from '../../models/building-footprint.ts';
import { RowFault } from './row-fault.ts';

type Point = readonly [number, number];

const WHAT: Readonly<Record<string, string>> = {
  Point: 'a point',
  MultiPoint: 'points',
  LineString: 'a line',
  MultiLineString: 'lines',
};

function list(value: unknown): readonly unknown[] {
  if (!Array.isArray(value)) throw new RowFault('Its coordinates are no lists of numbers.');
  return value;
}

function point(value: unknown): Point {
  const [x, y] = list(value);
  if (typeof x !== 'number' || typeof y !== 'number' || !Number.isFinite(x + y)) {
    throw new RowFault('It has a corner that is not two numbers.');
  }
  return [x, y];
}

function ring(value: unknown): Point[] {
  const given = list(value);
  if (given.length > IMPORT_LIMITS.corners + 1) {
    throw new RowFault('It has more than 10,000 corners. Simplify the outline.');
  }
  const points = given.map(point);
  const [first, last] = [points[0], points.at(-1)];
  if (first && last && (first[0] !== last[0] || first[1] !== last[1])) points.push(first);
  if (points.length < 4) throw new RowFault('It has a ring of fewer than three corners.');
  return points;
}

function rings(value: unknown): Point[][] {
  return list(value).map(ring);
}

function partsOf(value: unknown): Point[][][] {
  if (typeof value !== 'object' || value === null || !('type' in value)) {
    throw new RowFault('It has no geometry.');
  }
  if ('geometries' in value && value.type === 'GeometryCollection') {
    return list(value.geometries).flatMap(partsOf);
  }
  const coordinates = 'coordinates' in value ? value.coordinates : undefined;
  if (value.type === 'Polygon') {
    const part = rings(coordinates);
    return part.length === 0 ? [] : [part];
  }
  if (value.type === 'MultiPolygon') {
    return list(coordinates)
      .map(rings)
      .filter((part) => part.length > 0);
  }
  const what = typeof value.type === 'string' ? WHAT[value.type] : undefined;
  throw new RowFault(
    what === undefined
      ? 'Its geometry is of a kind that is not known here.'
      : `It is ${what}: a footprint is a polygon.`,
  );
}

/** The parts of a polygon or multipolygon, rings closed and heights dropped, or a RowFault. */
export function footprintOf(geometry: unknown): FootprintRings {
  if (geometry === null || geometry === undefined) throw new RowFault('It has no geometry.');
  const parts = partsOf(geometry);
  if (parts.length === 0) throw new RowFault('Its geometry is empty.');
  const corners = parts.flat().reduce((sum, { length }) => sum + length - 1, 0);
  if (corners > IMPORT_LIMITS.corners) {
    throw new RowFault('It has more than 10,000 corners. Simplify the outline.');
  }
  return parts;
}
