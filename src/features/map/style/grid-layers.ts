import type { LayerSpecification } from 'maplibre-gl';
import { MAP_COLOURS } from './map-colours.ts';
import { SOURCES } from './source-names.ts';

/** Crosses where the lines of the scheme's grid meet. */
export function gridLayers(): LayerSpecification[] {
  return [
    {
      id: 'grid-crosses',
      type: 'line',
      source: SOURCES.grid,
      paint: { 'line-color': MAP_COLOURS.bandLine, 'line-width': 0.8, 'line-opacity': 0.8 },
    },
  ];
}
