import type { Map as MapLibreMap } from 'maplibre-gl';
import { BUILDINGS_LAYER } from './style/source-names.ts';

/** Numbers of the buildings that can be seen, in the order of their references. */
export function buildingsInView(map: MapLibreMap): number[] {
  if (map.getLayer(BUILDINGS_LAYER) === undefined) return [];
  const references = new Map<number, string>();
  for (const { id, properties } of map.queryRenderedFeatures({ layers: [BUILDINGS_LAYER] })) {
    const reference: unknown = properties.reference;
    if (typeof id === 'number') references.set(id, typeof reference === 'string' ? reference : '');
  }
  const order = new Intl.Collator('en', { numeric: true });
  return [...references].sort(([, a], [, b]) => order.compare(a, b)).map(([id]) => id);
}
