import type { Map as MapLibreMap } from 'maplibre-gl';
import type { AimRequest, Handle } from '../map-drawing.ts';
import type { GridProjection } from '../place/grid-projection.ts';
import { gridPlaceAt } from '../place/view-of-map.ts';
import { BUILDINGS_LAYER } from '../style/source-names.ts';

type Pixel = { readonly x: number; readonly y: number };

/** Buildings that are drawn within some pixels of a point of the screen. */
function buildingsNear(map: MapLibreMap, { x, y }: Pixel, reach: number): number[] {
  if (map.getLayer(BUILDINGS_LAYER) === undefined) return [];
  const found = map.queryRenderedFeatures(
    [
      [x - reach, y - reach],
      [x + reach, y + reach],
    ],
    { layers: [BUILDINGS_LAYER] },
  );
  return [...new Set(found.flatMap(({ id }) => (typeof id === 'number' ? [id] : [])))];
}

/** Where the pointer is in the grid and what is near it; null outside of the grid. */
export function aimRequest(
  map: MapLibreMap,
  projection: GridProjection,
  pixel: Pixel,
  reach: number,
  isSquare: boolean,
  held: Handle | null,
): AimRequest | null {
  const place = gridPlaceAt(map, projection, pixel.x, pixel.y);
  const beside = gridPlaceAt(map, projection, pixel.x + reach, pixel.y);
  if (place === null || beside === null) return null;
  return {
    place,
    near: buildingsNear(map, pixel, reach),
    reach: Math.hypot(beside[0] - place[0], beside[1] - place[1]),
    isSquare,
    held,
  };
}
