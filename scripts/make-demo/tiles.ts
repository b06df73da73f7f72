import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { GeoJSONVT } from '@maplibre/geojson-vt';
import { fromGeojsonVt } from '@maplibre/vt-pbf';
import { bbox, featureCollection } from '@turf/turf';
import type { Basemap, LonLatBounds } from '../../shared/schemas/basemap.ts';
import { basemapLayers, type LayerContent } from './basemap-layers.ts';
import { tilesWithin, type Tile } from './tile-grid.ts';
import type { Town } from './town.ts';

const ZOOMS = [11, 12, 13, 14, 15, 16];
const EXTENT = 4096;
/** Of sea around the bank, in degrees; beyond it the map goes on in the colour of water. */
const MARGIN = { longitude: 0.004, latitude: 0.002 };

type Index = { readonly layer: LayerContent; readonly tiles: GeoJSONVT };

function indexOf(layer: LayerContent): Index {
  const options = { maxZoom: Math.max(...ZOOMS), extent: EXTENT, buffer: 64 };
  return { layer, tiles: new GeoJSONVT(featureCollection(layer.features), options) };
}

function boundsOf(layers: readonly LayerContent[]): LonLatBounds {
  const ground = layers.filter(({ name }) => name === 'land' || name === 'quays');
  const [west, south, east, north] = bbox(
    featureCollection(ground.flatMap(({ features }) => features)),
  );
  const { longitude, latitude } = MARGIN;
  return [west - longitude, south - latitude, east + longitude, north + latitude];
}

/** The bytes of one tile: every layer that can be told apart at its zoom and has something there. */
function tileBytes(indexes: readonly Index[], { z, x, y }: Tile): Uint8Array {
  const found = indexes.flatMap(({ layer, tiles }) => {
    const tile = z < layer.from ? null : tiles.getTile(z, x, y);
    return tile === null || tile.features.length === 0 ? [] : [[layer.name, tile] as const];
  });
  return fromGeojsonVt(Object.fromEntries(found), { version: 2, extent: EXTENT });
}

function write(file: string, content: Uint8Array | string): void {
  mkdirSync(path.dirname(file), { recursive: true });
  writeFileSync(file, content);
}

/**
 * Writes the basemap of a town as {z}/{x}/{y}.pbf, and where on earth it lies as tiles.json; what was
 * in the folder before goes. Every tile within the bounds is there: one that is missing is an error to
 * a map. Answers how many there are.
 */
export function writeTiles(town: Town, folder: string): number {
  const layers = basemapLayers(town);
  const bounds = boundsOf(layers);
  const indexes = layers.map(indexOf);
  const tiles = ZOOMS.flatMap((z) => tilesWithin(bounds, z));
  rmSync(folder, { recursive: true, force: true });
  for (const tile of tiles) {
    write(path.join(folder, `${tile.z}/${tile.x}/${tile.y}.pbf`), tileBytes(indexes, tile));
  }
  const basemap: Basemap = {
    tiles: ['/tiles/{z}/{x}/{y}.pbf'],
    bounds,
    minzoom: Math.min(...ZOOMS),
    maxzoom: Math.max(...ZOOMS),
  };
  write(path.join(folder, 'tiles.json'), `${JSON.stringify(basemap, null, 2)}\n`);
  return tiles.length;
}
