import type { MapPlan, TileSet } from '../../src/features/map/map-plan.ts';

export function tileSet(overrides: Partial<TileSet> = {}): TileSet {
  return {
    url: 'http://127.0.0.1/tiles/1/{z}/{x}/{y}.pbf',
    bounds: [1.6, 54.7, 1.7, 54.8],
    minzoom: 13,
    maxzoom: 17,
    ...overrides,
  };
}

/** A plan that shows nothing but what is asked for. */
export function mapPlan(overrides: Partial<MapPlan> = {}): MapPlan {
  return { latitude: 54.75, basemap: null, background: null, buildings: null, ...overrides };
}
