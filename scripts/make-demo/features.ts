import { signedArea } from './polygons.ts';
import type { Line, Point, Ring } from './vector.ts';

/** Where the town's own grid begins, EPSG:32631. */
export const origin: Point = [412000, 6068000];

export type Geometry =
  | { type: 'Point'; coordinates: Point }
  | { type: 'LineString'; coordinates: readonly Point[] }
  | { type: 'Polygon'; coordinates: readonly (readonly Point[])[] };
type Value = string | number | boolean | null;
export type Feature = {
  type: 'Feature';
  id: number;
  properties: Record<string, Value>;
  geometry: Geometry;
};

/** A place on the national grid, to the millimetre. */
function toGrid([x, y]: Point): Point {
  return [Math.round((x + origin[0]) * 1000) / 1000, Math.round((y + origin[1]) * 1000) / 1000];
}

/** A ring of the town's own grid on the national one, its first place repeated. */
export function closed(ring: Ring, isHole: boolean): Point[] {
  const turned = signedArea(ring) > 0 === isHole ? [...ring].reverse() : ring;
  const points = turned.map(toGrid);
  const [first] = points;
  return first === undefined ? [] : [...points, first];
}

export function polygon(outer: Ring, holes: readonly Ring[] = []): Geometry {
  return {
    type: 'Polygon',
    coordinates: [closed(outer, false), ...holes.map((hole) => closed(hole, true))],
  };
}

export function lineString(line: Line): Geometry {
  return { type: 'LineString', coordinates: line.map(toGrid) };
}

export function point(at: Point): Geometry {
  return { type: 'Point', coordinates: toGrid(at) };
}

export function collect(
  parts: readonly { geometry: Geometry; properties: Record<string, Value> }[],
): Feature[] {
  return parts.map(({ geometry, properties }, index) => ({
    type: 'Feature',
    id: index + 1,
    properties,
    geometry,
  }));
}
