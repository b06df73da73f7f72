import type { BasemapLayer } from '../../../../shared/schemas/basemap.ts';
import type { BackgroundLayer } from '../../../../shared/schemas/background.ts';
import { MAP_COLOURS } from '../../map/style/map-colours.ts';

/** How the features of a layer of tiles are drawn in a small picture. */
export type Look = {
  readonly layer: string;
  /** Only features of these kinds. */
  readonly kinds?: readonly string[];
  readonly fill?: string;
  readonly line?: string;
  /** In metres, where the feature has no width of its own. */
  readonly width?: number;
};

const { water, land, garden, park, road, yard, bldg, bldgEdge, ink2 } = MAP_COLOURS;

function ofBasemap(layer: BasemapLayer, look: Omit<Look, 'layer'>): Look {
  return { layer, ...look };
}

function ofBackground(layer: BackgroundLayer, look: Omit<Look, 'layer'>): Look {
  return { layer, ...look };
}

/** The demo's own map, from the ground up. */
export const BASEMAP_LOOKS: readonly Look[] = [
  ofBasemap('water', { kinds: ['sea'], fill: water }),
  ofBasemap('land', { fill: land }),
  ofBasemap('water', { kinds: ['cut'], fill: water }),
  ofBasemap('gardens', { fill: garden }),
  ofBasemap('parks', { kinds: ['park', 'churchyard'], fill: park }),
  ofBasemap('streets', { line: road, width: 6 }),
  ofBasemap('parks', { kinds: ['square'], fill: road }),
  ofBasemap('water', { kinds: ['harbour', 'dock'], fill: water }),
  ofBasemap('quays', { kinds: ['jetty', 'mole'], fill: yard }),
];

/** What was uploaded for a scheme. */
export const BACKGROUND_LOOKS: readonly Look[] = [
  ofBackground('water', { fill: water, line: water, width: 3 }),
  ofBackground('parks', { fill: park }),
  ofBackground('streets', { fill: road, line: road, width: 7 }),
  ofBackground('rail', { line: ink2, width: 2 }),
];

/** The register. */
export const BUILDING_LOOKS: readonly Look[] = [
  { layer: 'buildings', fill: bldg, line: bldgEdge, width: 0.6 },
];
