import type {
  ExpressionSpecification,
  LayerSpecification,
  SymbolLayerSpecification,
} from 'maplibre-gl';
import type { DraftLook } from '../map-drawing.ts';
import { LABEL_FONTS } from './label-fonts.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { SOURCES } from './source-names.ts';

const DRAFT = { source: SOURCES.draft } as const;
const { select, selectWash, clay, clayWash, ink, paperRaised } = MAP_COLOURS;
const PIECE: ExpressionSpecification = ['match', ['get', 'look'], ['piece', 'cut'], true, false];

function kind(name: string): ExpressionSpecification {
  return ['==', ['get', 'kind'], name];
}

function looks(...names: readonly DraftLook[]): ExpressionSpecification {
  return ['match', ['get', 'look'], [...names], true, false];
}

function areas(): LayerSpecification[] {
  return [
    {
      id: 'draft-areas',
      type: 'fill',
      ...DRAFT,
      filter: kind('area'),
      paint: {
        'fill-color': ['case', PIECE, clayWash, selectWash],
        'fill-opacity': 0.75,
        'fill-antialias': false,
      },
    },
    {
      id: 'draft-area-edges',
      type: 'line',
      ...DRAFT,
      filter: ['all', kind('area'), looks('outline', 'piece')],
      layout: { 'line-join': 'round' },
      paint: { 'line-color': ['case', PIECE, clay, select], 'line-width': 2 },
    },
  ];
}

function lines(): LayerSpecification[] {
  return [
    {
      id: 'draft-ghosts',
      type: 'line',
      ...DRAFT,
      filter: ['all', kind('line'), looks('ghost')],
      paint: { 'line-color': select, 'line-width': 1.5, 'line-dasharray': [3, 2] },
    },
    {
      id: 'draft-lines',
      type: 'line',
      ...DRAFT,
      filter: ['all', kind('line'), looks('outline', 'cut')],
      layout: { 'line-join': 'round', 'line-cap': 'round' },
      paint: { 'line-color': ['case', PIECE, clay, select], 'line-width': 2.5 },
    },
  ];
}

/** Handles: a finger gets larger ones. */
function points(): LayerSpecification[] {
  const isFinger = window.matchMedia('(pointer: coarse)').matches;
  const grow = isFinger ? 1.6 : 1;
  return [
    {
      id: 'draft-points',
      type: 'circle',
      ...DRAFT,
      filter: kind('point'),
      paint: {
        'circle-radius': [
          'match', ['get', 'look'],
          'middle', 3 * grow, 'target', 8 * grow, 'chosen', 6 * grow, 5 * grow,
        ],
        'circle-color': ['match', ['get', 'look'], 'chosen', select, paperRaised],
        'circle-opacity': ['match', ['get', 'look'], 'target', 0, 1],
        'circle-stroke-color': ['match', ['get', 'look'], 'target', clay, select],
        'circle-stroke-width': ['match', ['get', 'look'], 'middle', 1.2, 2],
      },
    },
  ]; // prettier-ignore
}

const TEXT_PAINT = {
  'text-color': ink,
  'text-halo-color': paperRaised,
  'text-halo-width': 1.8,
} satisfies SymbolLayerSpecification['paint'];

function texts(): LayerSpecification[] {
  const written: ExpressionSpecification = ['!=', ['get', 'text'], ''];
  return [
    {
      id: 'draft-lengths',
      type: 'symbol',
      ...DRAFT,
      filter: ['all', kind('line'), written],
      layout: {
        'symbol-placement': 'line-center',
        'text-field': ['get', 'text'],
        'text-font': LABEL_FONTS.regular,
        'text-size': 11,
        'text-offset': [0, -1],
        'text-max-angle': 90,
      },
      paint: TEXT_PAINT,
    },
    {
      id: 'draft-texts',
      type: 'symbol',
      ...DRAFT,
      filter: kind('text'),
      layout: {
        'text-field': ['get', 'text'],
        'text-font': LABEL_FONTS.semibold,
        'text-size': 12.5,
        'text-allow-overlap': true,
      },
      paint: TEXT_PAINT,
    },
  ];
}

/** What is being drawn, over everything else. */
export function draftLayers(): LayerSpecification[] {
  return [...areas(), ...lines(), ...texts(), ...points()];
}
