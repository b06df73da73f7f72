import type { Map as MapLibreMap } from 'maplibre-gl';
import { BUILDINGS_LAYER } from './style/source-names.ts';

function featuresInView(map: MapLibreMap) {
  if (map.getLayer(BUILDINGS_LAYER) === undefined) return [];
  return map.queryRenderedFeatures({ layers: [BUILDINGS_LAYER] });
}

/** Numbers of the buildings that can be seen. */
export function idsInView(map: MapLibreMap): Set<number> {
  const ids = featuresInView(map).map(({ id }) => id);
  return new Set(ids.filter((id) => typeof id === 'number'));
}

/** Numbers of the buildings that can be seen, in the order of their references. */
export function buildingsInView(map: MapLibreMap): number[] {
  const references = new Map<number, string>();
  for (const { id, properties } of featuresInView(map)) {
    const reference: unknown = properties.reference;
    if (typeof id === 'number') references.set(id, typeof reference === 'string' ? reference : '');
  }
  const order = new Intl.Collator('en', { numeric: true });
  return [...references].sort(([, a], [, b]) => order.compare(a, b)).map(([id]) => id);
}
