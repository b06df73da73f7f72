import type { ExpressionSpecification, LayerSpecification } from 'maplibre-gl';
import type { BackgroundLayer } from '../../../../shared/schemas/background.ts';
import { LABEL_FONTS } from './label-fonts.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { metresWide } from './metres-wide.ts';
import { SOURCES } from './source-names.ts';

/** What an uploaded street or railway is drawn as wide as: the files say nothing of widths. */
const STREET_METRES = 6;
const RAIL_METRES = 2.5;

const AREA: ExpressionSpecification = ['==', ['geometry-type'], 'Polygon'];
const ROUND = { 'line-cap': 'round', 'line-join': 'round' } as const;

function from(layer: BackgroundLayer) {
  return { source: SOURCES.background, 'source-layer': layer } as const;
}

function areas(): LayerSpecification[] {
  return [
    { id: 'background-parks', type: 'fill', ...from('parks'), filter: AREA, paint: { 'fill-color': MAP_COLOURS.park } },
    { id: 'background-water', type: 'fill', ...from('water'), filter: AREA, paint: { 'fill-color': MAP_COLOURS.water } },
    { id: 'background-shores', type: 'line', ...from('water'), layout: ROUND, paint: { 'line-color': MAP_COLOURS.waterLine, 'line-width': 1.1 } },
  ]; // prettier-ignore
}

function ways(latitude: number): LayerSpecification[] {
  const width = metresWide(STREET_METRES, latitude, 0.6);
  const edge = metresWide(STREET_METRES, latitude, 2);
  const rail = metresWide(RAIL_METRES, latitude, 0.6);
  const ties = metresWide(RAIL_METRES, latitude, -0.6);
  return [
    { id: 'background-street-edges', type: 'line', ...from('streets'), layout: ROUND, paint: { 'line-color': MAP_COLOURS.roadEdge, 'line-width': edge } },
    { id: 'background-streets', type: 'line', ...from('streets'), layout: ROUND, paint: { 'line-color': MAP_COLOURS.road, 'line-width': width } },
    { id: 'background-rail', type: 'line', ...from('rail'), paint: { 'line-color': MAP_COLOURS.rule, 'line-width': rail } },
    { id: 'background-rail-ties', type: 'line', ...from('rail'), paint: { 'line-color': MAP_COLOURS.paperRaised, 'line-width': ties, 'line-dasharray': [3, 3] } },
  ]; // prettier-ignore
}

/** The scheme's own streets, water, rail and parks, without their names. */
export function backgroundLayers(latitude: number): LayerSpecification[] {
  return [...areas(), ...ways(latitude)];
}

/** Names of the scheme's own streets. */
export function backgroundLabelLayers(): LayerSpecification[] {
  return [
    {
      id: 'background-street-names',
      type: 'symbol',
      ...from('streets'),
      minzoom: 14.5,
      layout: {
        'symbol-placement': 'line',
        'symbol-spacing': 320,
        'text-field': ['coalesce', ['get', 'name'], ''],
        'text-font': LABEL_FONTS.regular,
        'text-size': ['interpolate', ['linear'], ['zoom'], 15, 9, 18, 12.5],
        'text-max-angle': 30,
      },
      paint: {
        'text-color': MAP_COLOURS.ink2,
        'text-halo-color': MAP_COLOURS.road,
        'text-halo-width': 1.6,
      },
    },
  ];
}
