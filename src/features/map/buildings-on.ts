import type { Map as MapLibreMap } from 'maplibre-gl';
import type { PlanPoint, Segment } from '../../../shared/geometry/point.ts';
import type { GridProjection } from './place/grid-projection.ts';
import { BUILDINGS_LAYER } from './style/source-names.ts';

/** Where a building stands on a line, in metres from its start. */
export type StandsOn = {
  readonly id: number;
  readonly reference: string;
  readonly from: number;
  readonly to: number;
};

/** How far along a segment the sides of some rings cross it, in order. */
function crossings({ start, end }: Segment, rings: readonly (readonly PlanPoint[])[]): number[] {
  const length = Math.hypot(end[0] - start[0], end[1] - start[1]);
  const [dx, dy] = [(end[0] - start[0]) / length, (end[1] - start[1]) / length];
  const offLine = ([e, n]: PlanPoint) => dx * (n - start[1]) - dy * (e - start[0]);
  const along = ([e, n]: PlanPoint) => dx * (e - start[0]) + dy * (n - start[1]);
  const found = rings.flatMap((ring) =>
    ring.flatMap((corner, k) => {
      const next = ring[(k + 1) % ring.length] ?? corner;
      const [a, b] = [offLine(corner), offLine(next)];
      if (a < 0 === b < 0) return [];
      return [along(corner) + (a / (a - b)) * (along(next) - along(corner))];
    }),
  );
  return found.sort((a, b) => a - b);
}

/** The stretches of a segment that lie inside of some rings, holes left out. */
export function stretchesInside(
  segment: Segment,
  rings: readonly (readonly PlanPoint[])[],
): (readonly [from: number, to: number])[] {
  const { start, end } = segment;
  const length = Math.hypot(end[0] - start[0], end[1] - start[1]);
  const places = crossings(segment, rings);
  return places.flatMap((from, k) => {
    const to = places[k + 1];
    if (k % 2 === 1 || to === undefined || to < 0 || from > length) return [];
    return [[Math.max(0, from), Math.min(length, to)] as const];
  });
}

/** Stretches of the same building that touch are one: tiles cut it where they end. */
export function joinedStretches(stretches: readonly StandsOn[]): StandsOn[] {
  const TOUCHES = 0.5;
  const joined: StandsOn[] = [];
  for (const next of stretches.toSorted((a, b) => a.id - b.id || a.from - b.from)) {
    const last = joined.at(-1);
    if (last?.id === next.id && next.from <= last.to + TOUCHES) {
      joined[joined.length - 1] = { ...last, to: Math.max(last.to, next.to) };
    } else joined.push(next);
  }
  return joined;
}

function partsOf({ geometry }: GeoJSON.Feature): GeoJSON.Position[][][] {
  if (geometry.type === 'Polygon') return [geometry.coordinates];
  return geometry.type === 'MultiPolygon' ? geometry.coordinates : [];
}

/** Where the buildings that are drawn stand on a segment of the grid. */
export function buildingsOn(
  map: MapLibreMap,
  projection: GridProjection,
  segment: Segment,
): StandsOn[] {
  if (map.getLayer(BUILDINGS_LAYER) === undefined) return [];
  const found = map.queryRenderedFeatures({ layers: [BUILDINGS_LAYER] });
  const stretches = found.flatMap((feature) => {
    const { id, properties } = feature;
    const reference: unknown = properties.reference;
    if (typeof id !== 'number') return [];
    return partsOf(feature).flatMap((part) => {
      const rings = part.map((ring) =>
        ring.flatMap(([longitude = 0, latitude = 0]) => {
          const place = projection.toGrid([longitude, latitude]);
          return place === null ? [] : [place];
        }),
      );
      const name = typeof reference === 'string' ? reference : '';
      return stretchesInside(segment, rings).map(([from, to]) => ({
        ...{ id, reference: name, from, to },
      }));
    });
  });
  return joinedStretches(stretches);
}
