import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import { DAMAGE } from '../../../../shared/presentation/damage-style.ts';
import {
  SETTLEMENT_TINTS,
  STAGE_TINTS,
  type Tint,
} from '../../../../shared/presentation/ground-tints.ts';
import { FIRST_SHADE } from '../shades.ts';
import { NEAR_FROM } from './building-layers.ts';
import { SELECTED } from './building-states.ts';
import { damageName } from './damage-images.ts';
import { LABEL_FONTS } from './label-fonts.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { zoomOfScale } from './metres-wide.ts';
import {
  BUILDINGS_LAYER,
  BUILDINGS_TILE_LAYER,
  LABELS_TILE_LAYER,
  SOURCES,
} from './source-names.ts';

const BUILDINGS = { source: SOURCES.buildings, 'source-layer': BUILDINGS_TILE_LAYER } as const;
const LABELS = { source: SOURCES.buildings, 'source-layer': LABELS_TILE_LAYER } as const;
const SHADE: ExpressionSpecification = ['coalesce', ['feature-state', 'shade'], -1];

/** Close enough to read a number in a building, in pixels per metre; nearer, references stand there too. */
const NUMBERS_FROM = 2;
const REFERENCES_FROM = 18.5;

function whereShade(shade: number): ExpressionSpecification {
  return ['case', ['==', SHADE, shade], 1, 0];
}

function byShade(
  tints: readonly Tint[],
  otherwise: string | ExpressionSpecification,
): ExpressionSpecification {
  const [[first, colour] = [-1, MAP_COLOURS.bldg], ...rest] = tints;
  return ['match', SHADE, first, colour, ...rest.flat(), otherwise];
}

function shifted(tints: readonly Tint[], first: number): Tint[] {
  return tints.map(([number, colour]) => [first + number, colour]);
}

const FILLS = CATEGORIES.map(({ category }): Tint => [category, DAMAGE[category].fill]);
const EDGES = CATEGORIES.map(({ category }): Tint => [category, DAMAGE[category].edge]);
const TINTS = [
  ...shifted(FILLS, FIRST_SHADE.category),
  ...shifted(STAGE_TINTS, FIRST_SHADE.stage),
  ...shifted(SETTLEMENT_TINTS, FIRST_SHADE.settlement),
];

/** A pattern ignores the state of a building: one layer a category, seen where its number is; from near. */
function hatches(): LayerSpecification[] {
  const hatched = CATEGORIES.filter(({ category }) => DAMAGE[category].hatch !== null);
  return hatched.map(({ category }) => ({
    id: `category-${category}`,
    type: 'fill',
    ...BUILDINGS,
    minzoom: NEAR_FROM,
    paint: {
      'fill-pattern': damageName(category),
      'fill-opacity': whereShade(FIRST_SHADE.category + category),
      'fill-antialias': false,
    },
  }));
}

const EDGE_COLOUR = byShade(shifted(EDGES, FIRST_SHADE.category), MAP_COLOURS.bldgEdge);
const PLAIN: ExpressionSpecification = ['case', SELECTED, MAP_COLOURS.selectWash, MAP_COLOURS.bldg];

/** The layers of buildings with the colours of what was found of them. */
export function withShades(shapes: readonly LayerSpecification[]): LayerSpecification[] {
  return shapes.flatMap((layer): LayerSpecification[] => {
    if (layer.type === 'fill' && layer.id === BUILDINGS_LAYER) {
      const paint = { ...layer.paint, 'fill-color': byShade(TINTS, PLAIN) };
      return [{ ...layer, paint }, ...hatches()];
    }
    if (layer.type !== 'line' || layer.id !== 'building-edges') return [layer];
    const paint = { ...layer.paint, 'line-color': EDGE_COLOUR };
    // by another name: what hangs on a building's state does so in every plan, by the name of its layer
    return [{ ...layer, id: 'category-edges', paint }];
  });
}

const UNDER_NAME = ['literal', [0, 1.9]] satisfies ExpressionSpecification;
const UNDER_REFERENCE = ['literal', [0, 1.2]] satisfies ExpressionSpecification;
const HAS_NAME: ExpressionSpecification = ['has', 'name'];

/** Under a name or reference, where one stands in the middle. */
const BESIDE_NAME: ExpressionSpecification = [
  'step',
  ['zoom'],
  ['case', HAS_NAME, UNDER_NAME, ['literal', [0, 0]]],
  REFERENCES_FROM,
  ['case', HAS_NAME, UNDER_NAME, UNDER_REFERENCE],
];

/** What is written in buildings, by the number of their colour. */
const NUMBERS: readonly (readonly [shade: number, text: string])[] = [
  ...CATEGORIES.map(({ category, label }) => [FIRST_SHADE.category + category, label] as const),
  ...STAGE_TINTS.map(([stage]) => [FIRST_SHADE.stage + stage, String(stage)] as const),
];

/** The number of a category or stage in its building, one layer a number. */
export function shadeLabelLayers(latitude: number): LayerSpecification[] {
  return NUMBERS.map(([shade, text]) => ({
    id: `shade-number-${shade}`,
    type: 'symbol',
    ...LABELS,
    minzoom: zoomOfScale(NUMBERS_FROM, latitude),
    layout: {
      'text-field': text,
      'text-font': LABEL_FONTS.semibold,
      'text-size': 10.5,
      'text-offset': BESIDE_NAME,
      'text-allow-overlap': true,
      'text-ignore-placement': true,
    },
    paint: {
      'text-color': MAP_COLOURS.ink,
      'text-halo-color': MAP_COLOURS.paperRaised,
      'text-halo-width': 1.8,
      'text-opacity': whereShade(shade),
    },
  }));
}
