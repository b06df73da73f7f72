import type { Map as MapLibreMap, Point } from 'maplibre-gl';
import { BUILDINGS_LAYER, ROWS_LAYER } from '../style/source-names.ts';

/** The building or, where rows are shown, the row at a point of the screen, or within `reach` pixels. */
export function buildingAt(map: MapLibreMap, { x, y }: Point, reach = 0): number | null {
  const layer = [ROWS_LAYER, BUILDINGS_LAYER].find((id) => map.getLayer(id) !== undefined);
  if (layer === undefined) return null;
  const options = { layers: [layer] };
  const exact = map.queryRenderedFeatures([x, y], options);
  const near: [[number, number], [number, number]] = [
    [x - reach, y - reach],
    [x + reach, y + reach],
  ];
  const found = exact.length > 0 || reach === 0 ? exact : map.queryRenderedFeatures(near, options);
  const id = found[0]?.id;
  return typeof id === 'number' ? id : null;
}

/** Reference and name of the building at a place of the map's frame, as its tile has them. */
export function buildingNamedAt(map: MapLibreMap, [x, y]: readonly [number, number]): string {
  if (map.getLayer(BUILDINGS_LAYER) === undefined) return '';
  const [found] = map.queryRenderedFeatures([x, y], { layers: [BUILDINGS_LAYER] });
  const words: unknown[] = [found?.properties.reference, found?.properties.name];
  return words.filter((word) => typeof word === 'string').join(' ');
}
