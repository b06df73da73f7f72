import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';
import { HOVERED, SELECTED, solidity } from './building-states.ts';
import { hatchName } from './hatch-images.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { ROW_LOOKS, type RowLook } from './row-looks.ts';
import { ROWS_LAYER, ROWS_TILE_LAYER, SOURCES } from './source-names.ts';

const ROWS = { source: SOURCES.rows, 'source-layer': ROWS_TILE_LAYER } as const;
const LOOKS: readonly (readonly [string, RowLook])[] = Object.entries(ROW_LOOKS);

function byOutcome(value: (look: RowLook) => string | number): ExpressionSpecification {
  const { same, new: fresh, changed, refused, conflict } = ROW_LOOKS;
  return [
    'match', ['get', 'outcome'],
    'new', value(fresh), 'changed', value(changed),
    'refused', value(refused), 'conflict', value(conflict), value(same),
  ]; // prettier-ignore
}

function hatches([outcome, { hatch, edge }]: readonly [string, RowLook]): LayerSpecification[] {
  if (hatch === undefined) return [];
  return [
    {
      id: `row-hatch-${outcome}`,
      type: 'fill',
      ...ROWS,
      filter: ['==', ['get', 'outcome'], outcome],
      paint: { 'fill-pattern': hatchName(hatch, edge) },
    },
  ];
}

function edges([outcome, { edge, width, dashes }]: readonly [string, RowLook]): LayerSpecification {
  return {
    id: `row-edge-${outcome}`,
    type: 'line',
    ...ROWS,
    filter: ['==', ['get', 'outcome'], outcome],
    layout: { 'line-join': 'round' },
    paint: {
      'line-color': edge,
      'line-width': ['interpolate', ['linear'], ['zoom'], 13, width / 3, 16, width],
      ...(dashes !== undefined && { 'line-dasharray': [...dashes] }),
    },
  };
}

/** The rows of a file by what becomes of them: what waits for an answer lies on top. */
export function rowLayers(): LayerSpecification[] {
  return [
    {
      id: ROWS_LAYER,
      type: 'fill',
      ...ROWS,
      paint: {
        'fill-color': ['case', SELECTED, MAP_COLOURS.selectWash, byOutcome(({ fill }) => fill)],
        'fill-opacity': byOutcome(({ opacity }) => opacity),
        'fill-antialias': false,
      },
    },
    ...LOOKS.flatMap(hatches),
    ...LOOKS.map(edges),
    {
      id: 'row-marks',
      type: 'line',
      ...ROWS,
      layout: { 'line-join': 'miter' },
      paint: {
        'line-color': ['case', SELECTED, MAP_COLOURS.select, MAP_COLOURS.ink],
        'line-width': ['case', SELECTED, 3, HOVERED, 1.5, 0],
      },
    },
  ];
}

/** Layers that stay in the background of others. */
export function faintLayers(layers: readonly LayerSpecification[]): LayerSpecification[] {
  return layers.map((layer) => {
    if (layer.type === 'fill') {
      return { ...layer, paint: { ...layer.paint, 'fill-opacity': solidity(0.4, 0.4) } };
    }
    if (layer.type !== 'line') return layer;
    return { ...layer, paint: { ...layer.paint, 'line-opacity': 0.5 } };
  });
}
