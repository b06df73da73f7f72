import type { Map as MapLibreMap, Point } from 'maplibre-gl';
import { BUILDINGS_LAYER } from '../style/source-names.ts';

/** The building at a point of the screen, or no further from it than `reach` pixels. */
export function buildingAt(map: MapLibreMap, { x, y }: Point, reach = 0): number | null {
  if (map.getLayer(BUILDINGS_LAYER) === undefined) return null;
  const options = { layers: [BUILDINGS_LAYER] };
  const exact = map.queryRenderedFeatures([x, y], options);
  const near: [[number, number], [number, number]] = [
    [x - reach, y - reach],
    [x + reach, y + reach],
  ];
  const found = exact.length > 0 || reach === 0 ? exact : map.queryRenderedFeatures(near, options);
  const id = found[0]?.id;
  return typeof id === 'number' ? id : null;
}
