import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';
import { MAP_COLOURS } from './map-colours.ts';
import { metresWide } from './metres-wide.ts';
import { SOURCES } from './source-names.ts';

const STREETS = { source: SOURCES.basemap, 'source-layer': 'streets' } as const;
const WIDTH: ExpressionSpecification = ['get', 'width'];

const IS_BRIDGE: ExpressionSpecification = ['==', ['get', 'class'], 'bridge'];
const IS_QUAY: ExpressionSpecification = ['==', ['get', 'class'], 'quay'];

type StreetStyle = {
  readonly name: string;
  readonly filter: ExpressionSpecification;
  readonly cap: 'round' | 'butt';
  readonly latitude: number;
};

/** White, as wide as on the ground. */
function roadway({ name, filter, cap, latitude }: StreetStyle): LayerSpecification {
  return {
    id: name,
    type: 'line',
    ...STREETS,
    filter,
    layout: { 'line-cap': cap, 'line-join': 'round' },
    paint: { 'line-color': MAP_COLOURS.road, 'line-width': metresWide(WIDTH, latitude) },
  };
}

/** White with an edge; where streets meet, they stay open to each other. */
function street(style: StreetStyle): LayerSpecification[] {
  const { name, filter, cap, latitude } = style;
  return [
    {
      id: `${name}-edges`,
      type: 'line',
      ...STREETS,
      filter,
      layout: { 'line-cap': cap, 'line-join': 'round' },
      paint: { 'line-color': MAP_COLOURS.roadEdge, 'line-width': metresWide(WIDTH, latitude, 1.4) },
    },
    roadway(style),
  ];
}

/** Streets and squares of the demo. */
export function streetLayers(latitude: number): LayerSpecification[] {
  return [
    ...street({ name: 'streets', filter: ['!', IS_BRIDGE], cap: 'round', latitude }),
    {
      id: 'squares',
      type: 'fill',
      source: SOURCES.basemap,
      'source-layer': 'parks',
      filter: ['==', ['get', 'kind'], 'square'],
      paint: { 'fill-color': MAP_COLOURS.road },
    },
  ];
}

/** Streets over the harbour, and the quays once more, so that no edge of a bridge lies across them. */
export function bridgeLayers(latitude: number): LayerSpecification[] {
  return [
    ...street({ name: 'bridges', filter: IS_BRIDGE, cap: 'butt', latitude }),
    roadway({ name: 'bridge-ends', filter: IS_QUAY, cap: 'butt', latitude }),
  ];
}

/** Trees of the demo, as wide as their crowns. */
export function treeLayers(latitude: number): LayerSpecification[] {
  return [
    {
      id: 'trees',
      type: 'circle',
      source: SOURCES.basemap,
      'source-layer': 'trees',
      minzoom: 15,
      paint: {
        'circle-color': MAP_COLOURS.tree,
        'circle-radius': metresWide(['*', 0.85, ['get', 'radius']], latitude),
      },
    },
  ];
}
