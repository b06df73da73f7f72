import type { SourceSpecification } from 'maplibre-gl';
import type { MapPlan, TileSet } from '../map-plan.ts';
import { SOURCES } from './source-names.ts';

export type SourcesByName = Readonly<Record<string, SourceSpecification>>;

function vectorSource({ url, bounds, minzoom, maxzoom }: TileSet): SourceSpecification {
  const extent = bounds === null ? {} : { bounds };
  return { type: 'vector', tiles: [url], ...extent, minzoom, maxzoom };
}

function shapesOfOurs(): SourceSpecification {
  return { type: 'geojson', data: { type: 'FeatureCollection', features: [] } };
}

/** Where the map takes what the plan shows from. */
export function sourcesOfPlan(plan: MapPlan): SourcesByName {
  const { basemap, background, buildings, rows } = plan;
  const tileSets = { basemap, background, buildings, rows };
  const named = Object.entries(tileSets).flatMap(([name, tiles]) =>
    tiles === null || tiles === undefined ? [] : [[name, vectorSource(tiles)] as const],
  );
  return {
    ...Object.fromEntries(named),
    [SOURCES.grid]: shapesOfOurs(),
    ...(plan.hasLine === true && {
      [SOURCES.line]: shapesOfOurs(),
      [SOURCES.section]: shapesOfOurs(),
    }),
    ...(plan.canDraw === true && { [SOURCES.draft]: shapesOfOurs() }),
  };
}
