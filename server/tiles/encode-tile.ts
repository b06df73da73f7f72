import { geoJSONToTile } from '@maplibre/geojson-vt';
import { fromGeojsonVt } from '@maplibre/vt-pbf';
import type { Feature } from 'geojson';
import { TILE_MARGIN, type TilePlace } from './tile-bounds.ts';

const EXTENT = 4096;

/** What is drawn in each layer of a tile. */
export type TileLayers = Readonly<Record<string, Feature[]>>;

/** A vector tile of some layers; no bytes where nothing is in it. `tolerance` thins lines, in 4096ths of the tile. */
export function encodeTile(layers: TileLayers, { z, x, y }: TilePlace, tolerance: number): Buffer {
  const options = {
    extent: EXTENT,
    buffer: TILE_MARGIN * EXTENT,
    tolerance,
    // thins at every zoom alike: at the greatest zoom it would not
    maxZoom: 24,
    clip: true,
  };
  const tiles = Object.entries(layers).flatMap(([name, features]) => {
    const tile = geoJSONToTile({ type: 'FeatureCollection', features }, z, x, y, options);
    return tile.features.length === 0 ? [] : [[name, tile] as const];
  });
  if (tiles.length === 0) return Buffer.alloc(0);
  // a copy, for what is returned sits in a larger buffer
  return Buffer.from(fromGeojsonVt(Object.fromEntries(tiles), { version: 2, extent: EXTENT }));
}
