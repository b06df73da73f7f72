import type {
  ExpressionSpecification,
  LayerSpecification,
  SymbolLayerSpecification,
} from 'maplibre-gl';
import type { LineShape, SectionShape } from '../map-line.ts';
import { LABEL_FONTS } from './label-fonts.ts';
import { MAP_COLOURS } from './map-colours.ts';
import { SOURCES } from './source-names.ts';

const LINE = { source: SOURCES.line } as const;
const SECTION = { source: SOURCES.section } as const;
const { ink, bandLine, paperRaised, clay, clayDeep } = MAP_COLOURS;
type SymbolLayout = NonNullable<SymbolLayerSpecification['layout']>;
const LEVEL: ExpressionSpecification = ['get', 'level'];
/** In mm: the outermost contour is dashed, the one that people ask for first is drawn heavier. */
const [OUTERMOST, EMPHASISED] = [1, 10];

function kind(name: (LineShape | SectionShape)['kind']): ExpressionSpecification {
  return ['==', ['get', 'kind'], name];
}

function contours(): LayerSpecification[] {
  return [
    {
      id: 'line-contours',
      type: 'line',
      ...LINE,
      filter: ['all', kind('contour'), ['!=', LEVEL, OUTERMOST]],
      layout: { 'line-join': 'round' },
      paint: {
        'line-color': bandLine,
        'line-width': ['case', ['==', LEVEL, EMPHASISED], 2, 1],
      },
    },
    {
      id: 'line-outermost-contours',
      type: 'line',
      ...LINE,
      filter: ['all', kind('contour'), ['==', LEVEL, OUTERMOST]],
      layout: { 'line-join': 'round' },
      paint: { 'line-color': bandLine, 'line-width': 1, 'line-dasharray': [5, 3] },
    },
  ];
}

function drives(): LayerSpecification[] {
  return [
    {
      id: 'line-edges',
      type: 'line',
      ...LINE,
      filter: kind('edge'),
      paint: { 'line-color': ink, 'line-width': 1.1, 'line-dasharray': [1, 2] },
    },
    {
      id: 'line-axes',
      type: 'line',
      ...LINE,
      filter: kind('axis'),
      paint: { 'line-color': ink, 'line-width': 1.5, 'line-dasharray': [8, 2.2, 1.4, 2.2] },
    },
    {
      id: 'line-ticks',
      type: 'line',
      ...LINE,
      filter: kind('tick'),
      paint: { 'line-color': ink, 'line-width': 1.3 },
    },
    {
      id: 'line-shafts',
      type: 'circle',
      ...LINE,
      filter: kind('shaft'),
      paint: {
        'circle-radius': 6,
        'circle-color': paperRaised,
        'circle-stroke-color': ink,
        'circle-stroke-width': 2,
      },
    },
  ];
}

/** Where settlement reaches the outermost contour, lightly, under the buildings. */
export function bandLayers(): LayerSpecification[] {
  return [
    {
      id: 'line-band',
      type: 'fill',
      ...LINE,
      filter: kind('band'),
      paint: { 'fill-color': bandLine, 'fill-opacity': 0.1, 'fill-antialias': false },
    },
  ];
}

/** Contours of settlement, edges, axes and chainages of a designed line, and the mark of a section. */
export function lineLayers(): LayerSpecification[] {
  return [
    ...contours(),
    ...drives(),
    {
      id: 'section-mark',
      type: 'line',
      ...SECTION,
      filter: kind('mark'),
      paint: { 'line-color': clay, 'line-width': 1.6 },
    },
  ];
}

/** Words of the line: one type for all, with a halo that parts them from what lies under them. */
function words(
  { id, of, from = LINE }: { id: string; of: ReturnType<typeof kind>; from?: { source: string } },
  colour: string,
  layout: SymbolLayout,
): SymbolLayerSpecification {
  return {
    id,
    type: 'symbol',
    ...from,
    filter: of,
    layout: { 'text-field': ['get', 'text'], 'text-font': LABEL_FONTS.semibold, ...layout },
    paint: { 'text-color': colour, 'text-halo-color': paperRaised, 'text-halo-width': 1.8 },
  };
}

/** What is written on them; what meets something else is left out. */
export function lineLabelLayers(): LayerSpecification[] {
  return [
    words({ id: 'line-contour-levels', of: kind('contour') }, bandLine, {
      'symbol-placement': 'line',
      'symbol-spacing': 300,
      'text-field': ['case', ['==', LEVEL, EMPHASISED], '10 mm', ['to-string', LEVEL]],
      'text-size': 10.5,
      'text-max-angle': 40,
      'text-padding': 3,
    }),
    words({ id: 'line-chainages', of: kind('chainage') }, ink, {
      'text-size': 11,
      'text-padding': 3,
    }),
    words({ id: 'line-shaft-names', of: kind('shaft') }, ink, {
      'text-size': 11.5,
      'text-anchor': 'top',
      'text-offset': [0, 0.8],
      'text-padding': 3,
    }),
    words({ id: 'section-name', of: kind('name'), from: SECTION }, clayDeep, {
      'text-size': 11,
      'text-anchor': 'left',
      'text-offset': [0.6, 0],
      'text-allow-overlap': true,
      'text-ignore-placement': true,
    }),
  ];
}
