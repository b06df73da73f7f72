import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';
import { LABEL_FONTS } from './label-fonts.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { SOURCES } from './source-names.ts';

const IS_WATER: ExpressionSpecification = [
  'in',
  ['get', 'kind'],
  ['literal', ['harbour', 'dock', 'cut']],
];

const STREET_SIZE: ExpressionSpecification = [
  'interpolate', ['linear'], ['zoom'],
  15, ['match', ['get', 'class'], ['main', 'quay', 'square', 'bridge'], 10.5, 9],
  18, ['match', ['get', 'class'], ['main', 'quay', 'square', 'bridge'], 13, 12],
]; // prettier-ignore

/** Names of the demo's streets along them. */
function streetNames(): LayerSpecification {
  return {
    id: 'street-names',
    type: 'symbol',
    source: SOURCES.basemap,
    'source-layer': 'streets',
    minzoom: 14.5,
    layout: {
      'symbol-placement': 'line',
      'symbol-spacing': 320,
      'text-field': ['get', 'name'],
      'text-font': LABEL_FONTS.regular,
      'text-size': STREET_SIZE,
      'text-max-angle': 30,
      'text-padding': 6,
      'symbol-sort-key': ['-', ['get', 'width']],
    },
    paint: {
      'text-color': MAP_COLOURS.ink2,
      'text-halo-color': MAP_COLOURS.road,
      'text-halo-width': 1.6,
    },
  };
}

/** Names of waters, parks and squares of the demo. */
function placeNames(): LayerSpecification {
  return {
    id: 'place-names',
    type: 'symbol',
    source: SOURCES.basemap,
    'source-layer': 'places',
    minzoom: 14,
    filter: ['in', ['get', 'kind'], ['literal', ['harbour', 'dock', 'cut', 'park']]],
    layout: {
      'text-field': ['get', 'name'],
      'text-font': LABEL_FONTS.italic,
      'text-size': ['interpolate', ['linear'], ['zoom'], 14, 11, 18, 15],
      'text-letter-spacing': 0.06,
      'text-max-width': 7,
    },
    paint: {
      'text-color': ['case', IS_WATER, MAP_COLOURS.waterInk, MAP_COLOURS.parkInk],
      'text-halo-color': ['case', IS_WATER, MAP_COLOURS.water, MAP_COLOURS.park],
      'text-halo-width': 1.4,
    },
  };
}

/** What the demo's basemap is labelled with. */
export function labelLayers(): LayerSpecification[] {
  return [placeNames(), streetNames()];
}
