import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';
import type { BasemapLayer } from '../../../../shared/schemas/basemap.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { SOURCES } from './source-names.ts';

function from(layer: BasemapLayer) {
  return { source: SOURCES.basemap, 'source-layer': layer } as const;
}

function isKind(...kinds: string[]): ExpressionSpecification {
  return ['in', ['get', 'kind'], ['literal', kinds]];
}

const PARK_COLOUR: ExpressionSpecification = [
  'match',
  ['get', 'kind'],
  ['park', 'churchyard'],
  MAP_COLOURS.park,
  'square',
  MAP_COLOURS.road,
  'quay',
  MAP_COLOURS.land,
  MAP_COLOURS.yard,
];

const GARDEN_COLOUR: ExpressionSpecification = [
  'match',
  ['get', 'style'],
  ['works', 'stores'],
  MAP_COLOURS.yard,
  MAP_COLOURS.garden,
];

const WATERSIDE = { 'line-color': MAP_COLOURS.waterLine, 'line-width': 1.1 } as const;

function water(id: string, ...kinds: string[]): LayerSpecification {
  const paint = { 'fill-color': MAP_COLOURS.water };
  return { id, type: 'fill', ...from('water'), filter: isKind(...kinds), paint };
}

function waterside(
  id: string,
  layer: 'land' | 'quays' | 'water',
  ...kinds: string[]
): LayerSpecification {
  return { id, type: 'line', ...from(layer), filter: isKind(...kinds), paint: WATERSIDE };
}

/** Sea and land of the demo, with the line where they meet, and the water that streets lead over. */
function seaAndLand(): LayerSpecification[] {
  return [
    water('sea', 'sea'),
    { id: 'land', type: 'fill', ...from('land'), paint: { 'fill-color': MAP_COLOURS.land } },
    waterside('shore', 'land', 'bank'),
    water('cut', 'cut'),
    waterside('cut-sides', 'water', 'cut'),
  ];
}

/** The harbour with its quays: streets end at it, or lie on bridges above it. */
export function harbourLayers(): LayerSpecification[] {
  return [
    water('harbour', 'harbour', 'dock'),
    waterside('quays', 'quays', 'quay wall'),
    {
      id: 'jetties',
      type: 'fill',
      ...from('quays'),
      filter: isKind('jetty', 'mole'),
      paint: { 'fill-color': MAP_COLOURS.yard },
    },
    waterside('jetty-sides', 'quays', 'jetty', 'mole'),
  ];
}

/** Gardens with their walls, and parks and yards. */
function openGround(): LayerSpecification[] {
  return [
    { id: 'gardens', type: 'fill', ...from('gardens'), paint: { 'fill-color': GARDEN_COLOUR } },
    {
      id: 'garden-walls',
      type: 'line',
      ...from('garden-walls'),
      minzoom: 15,
      paint: { 'line-color': MAP_COLOURS.roadEdge, 'line-width': 0.7 },
    },
    { id: 'parks', type: 'fill', ...from('parks'), paint: { 'fill-color': PARK_COLOUR } },
  ];
}

/** The ground of the demo's basemap, from the water up to the parks. */
export function groundLayers(): LayerSpecification[] {
  return [...seaAndLand(), ...openGround()];
}
