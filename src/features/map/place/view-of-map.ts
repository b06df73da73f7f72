import type { Map as MapLibreMap } from 'maplibre-gl';
import type { GridBounds } from './grid-crosses.ts';
import type { GridPlace, GridProjection } from './grid-projection.ts';

const HALF_SPAN = 50;

/** The grid under a point of the screen. */
export function gridPlaceAt(
  map: MapLibreMap,
  projection: GridProjection,
  x: number,
  y: number,
): GridPlace | null {
  const { lng, lat } = map.unproject([x, y]);
  return projection.toGrid([lng, lat]);
}

function sizeOf(map: MapLibreMap): readonly [width: number, height: number] {
  const { clientWidth, clientHeight } = map.getContainer();
  return [clientWidth, clientHeight];
}

/** The grid at the middle of the map. */
export function placeAtCentre(map: MapLibreMap, projection: GridProjection): GridPlace | null {
  const [width, height] = sizeOf(map);
  return gridPlaceAt(map, projection, width / 2, height / 2);
}

/** How many metres of the grid a pixel in the middle of the map is wide. */
export function metresPerPixel(map: MapLibreMap, projection: GridProjection): number | null {
  const [width, height] = sizeOf(map);
  const left = gridPlaceAt(map, projection, width / 2 - HALF_SPAN, height / 2);
  const right = gridPlaceAt(map, projection, width / 2 + HALF_SPAN, height / 2);
  if (left === null || right === null) return null;
  return Math.hypot(right[0] - left[0], right[1] - left[1]) / (2 * HALF_SPAN);
}

/** What is in view, in the grid; null where a corner lies outside of it. */
export function gridBoundsOfView(map: MapLibreMap, projection: GridProjection): GridBounds | null {
  const [width, height] = sizeOf(map);
  const corners = [
    [0, 0],
    [width, 0],
    [0, height],
    [width, height],
  ] as const;
  const places = corners.map(([x, y]) => gridPlaceAt(map, projection, x, y));
  const known = places.filter((place) => place !== null);
  if (known.length < places.length) return null;
  const [eastings, northings] = [known.map(([e]) => e), known.map(([, n]) => n)];
  return [
    Math.min(...eastings),
    Math.min(...northings),
    Math.max(...eastings),
    Math.max(...northings),
  ];
}
