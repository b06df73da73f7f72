import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';
import { LABEL_FONTS } from './label-fonts.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { BUILDINGS_LAYER, BUILDINGS_TILE_LAYER, SOURCES } from './source-names.ts';

const BUILDINGS = { source: SOURCES.buildings, 'source-layer': BUILDINGS_TILE_LAYER } as const;

function whileMarked(mark: 'selected' | 'hovered'): ExpressionSpecification {
  return ['boolean', ['feature-state', mark], false];
}

const SELECTED = whileMarked('selected');
const HOVERED = whileMarked('hovered');

/** Buildings with a darker edge; a blue outline round the selected one. */
export function buildingLayers(): LayerSpecification[] {
  return [
    {
      id: BUILDINGS_LAYER,
      type: 'fill',
      ...BUILDINGS,
      paint: {
        'fill-color': ['case', SELECTED, MAP_COLOURS.selectWash, MAP_COLOURS.bldg],
        'fill-antialias': false,
      },
    },
    {
      id: 'building-edges',
      type: 'line',
      ...BUILDINGS,
      layout: { 'line-join': 'round' },
      paint: {
        'line-color': MAP_COLOURS.bldgEdge,
        'line-width': ['interpolate', ['linear'], ['zoom'], 13, 0.25, 16, 0.7, 19, 1.2],
      },
    },
    {
      id: 'building-marks',
      type: 'line',
      ...BUILDINGS,
      layout: { 'line-join': 'miter' },
      paint: {
        'line-color': ['case', SELECTED, MAP_COLOURS.select, MAP_COLOURS.ink],
        'line-width': ['case', SELECTED, 3, HOVERED, 1.5, 0],
      },
    },
  ];
}

function label(
  id: string,
  minzoom: number,
  text: ExpressionSpecification,
  isNamed: boolean,
): LayerSpecification {
  const hasName: ExpressionSpecification = ['has', 'name'];
  return {
    id,
    type: 'symbol',
    ...BUILDINGS,
    minzoom,
    filter: isNamed ? hasName : ['!', hasName],
    layout: {
      'text-field': text,
      'text-font': isNamed ? LABEL_FONTS.semibold : LABEL_FONTS.regular,
      'text-size': isNamed ? 11 : 10,
      'text-max-width': 9,
      'text-padding': 4,
    },
    paint: {
      'text-color': isNamed ? MAP_COLOURS.ink : MAP_COLOURS.ink2,
      'text-halo-color': MAP_COLOURS.paperRaised,
      'text-halo-width': 1.6,
    },
  };
}

/** Names of buildings that have one, and from close by the references of the others. */
export function buildingLabelLayers(): LayerSpecification[] {
  return [
    label('building-references', 18.5, ['get', 'reference'], false),
    label('building-names', 16.3, ['get', 'name'], true),
  ];
}
