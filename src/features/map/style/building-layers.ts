import type {
  ExpressionSpecification,
  LayerSpecification,
  SymbolLayerSpecification,
} from 'maplibre-gl';
import { HOVERED, SELECTED, solidity } from './building-states.ts';
import { LABEL_FONTS } from './label-fonts.ts';
import { MAP_COLOURS } from './map-colours.ts';
import {
  BUILDINGS_LAYER,
  BUILDINGS_TILE_LAYER,
  LABELS_TILE_LAYER,
  SOURCES,
} from './source-names.ts';

const LABELS = { source: SOURCES.buildings, 'source-layer': LABELS_TILE_LAYER } as const;
const BUILDINGS = { source: SOURCES.buildings, 'source-layer': BUILDINGS_TILE_LAYER } as const;

/**
 * From here on edges take a colour and hatches are drawn. Farther off a building is a few pixels, and
 * what hangs on its state is told to a whole town at once.
 */
export const NEAR_FROM = 14;

const MARK_WIDTH: ExpressionSpecification = ['case', SELECTED, 3, HOVERED, 1.5, 0];

function edges(): LayerSpecification[] {
  const edge = {
    type: 'line',
    ...BUILDINGS,
    paint: {
      'line-color': MAP_COLOURS.bldgEdge,
      'line-width': ['interpolate', ['linear'], ['zoom'], 13, 0.25, 16, 0.7, 19, 1.2],
    },
  } satisfies Omit<LayerSpecification, 'id'>;
  return [
    { id: 'building-far-edges', ...edge, maxzoom: NEAR_FROM },
    { id: 'building-edges', ...edge, minzoom: NEAR_FROM },
  ];
}

function marks(): LayerSpecification[] {
  const mark = { type: 'line', ...BUILDINGS, layout: { 'line-join': 'miter' } } as const;
  return [
    {
      id: 'building-far-marks',
      ...mark,
      maxzoom: NEAR_FROM,
      paint: { 'line-color': MAP_COLOURS.select, 'line-width': MARK_WIDTH },
    },
    {
      id: 'building-marks',
      ...mark,
      minzoom: NEAR_FROM,
      paint: {
        'line-color': ['case', SELECTED, MAP_COLOURS.select, MAP_COLOURS.ink],
        'line-width': MARK_WIDTH,
      },
    },
  ];
}

/** Buildings with a darker edge; a blue outline round the selected one. */
export function buildingLayers(): LayerSpecification[] {
  return [
    {
      id: BUILDINGS_LAYER,
      type: 'fill',
      ...BUILDINGS,
      paint: {
        'fill-color': ['case', SELECTED, MAP_COLOURS.selectWash, MAP_COLOURS.bldg],
        'fill-opacity': solidity(1, 1),
        'fill-antialias': false,
      },
    },
    ...edges(),
    ...marks(),
  ];
}

const LABEL_LAYOUT = { 'text-max-width': 9, 'text-padding': 4 } as const;

const LABEL_PAINT = {
  'text-halo-color': MAP_COLOURS.paperRaised,
  'text-halo-width': 1.6,
  // what is selected is named at the side, and its outline stays clear
  'text-opacity': ['case', SELECTED, 0, 1],
} satisfies SymbolLayerSpecification['paint'];

/** Names of buildings that have one, and from close by the references of the others. */
export function buildingLabelLayers(): LayerSpecification[] {
  return [
    {
      id: 'building-references',
      type: 'symbol',
      ...LABELS,
      minzoom: 18.5,
      filter: ['!', ['has', 'name']],
      layout: {
        ...LABEL_LAYOUT,
        'text-field': ['get', 'reference'],
        'text-font': LABEL_FONTS.regular,
        'text-size': 10,
      },
      paint: { ...LABEL_PAINT, 'text-color': MAP_COLOURS.ink2 },
    },
    {
      id: 'building-names',
      type: 'symbol',
      ...LABELS,
      minzoom: 16.3,
      filter: ['has', 'name'],
      layout: {
        ...LABEL_LAYOUT,
        'text-field': ['get', 'name'],
        'text-font': LABEL_FONTS.semibold,
        'text-size': 11,
      },
      paint: { ...LABEL_PAINT, 'text-color': MAP_COLOURS.ink },
    },
  ];
}
