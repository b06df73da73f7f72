import type { SourceSpecification } from 'maplibre-gl';
import type { MapPlan, TileSet } from '../map-plan.ts';
import { SOURCES } from './source-names.ts';

export type SourcesByName = Readonly<Record<string, SourceSpecification>>;

function vectorSource({ url, bounds, minzoom, maxzoom }: TileSet): SourceSpecification {
  const extent = bounds === null ? {} : { bounds };
  return { type: 'vector', tiles: [url], ...extent, minzoom, maxzoom };
}

/** Where the map takes what the plan shows from. */
export function sourcesOfPlan({ basemap, background, buildings }: MapPlan): SourcesByName {
  const tileSets = { basemap, background, buildings };
  const named = Object.entries(tileSets).flatMap(([name, tiles]) =>
    tiles === null ? [] : [[name, vectorSource(tiles)] as const],
  );
  return {
    ...Object.fromEntries(named),
    [SOURCES.grid]: { type: 'geojson', data: { type: 'FeatureCollection', features: [] } },
  };
}
