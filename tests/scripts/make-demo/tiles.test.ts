import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { tilesWithin } from '../../../scripts/make-demo/tile-grid.ts';
import { writeTiles } from '../../../scripts/make-demo/tiles.ts';
import { makeTown } from '../../../scripts/make-demo/town.ts';
import { BASEMAP_LAYERS, basemapSchema, type Basemap } from '../../../shared/schemas/basemap.ts';
import { readTile } from '../../support/read-tile.ts';

describe('tilesWithin', () => {
  it('gives the one tile of the whole world', () => {
    expect(tilesWithin([-170, -80, 170, 80], 0)).toEqual([{ z: 0, x: 0, y: 0 }]);
  });

  it('counts columns from the west and rows from the north', () => {
    expect(tilesWithin([-1, 1, 1, 2], 1)).toEqual([
      { z: 1, x: 0, y: 0 },
      { z: 1, x: 1, y: 0 },
    ]);
    // Greenwich, as published maps number it
    expect(tilesWithin([-0.0015, 51.4778, -0.0014, 51.4779], 12)).toEqual([
      { z: 12, x: 2047, y: 1362 },
    ]);
  });
});

describe('the tiles of the demo town', () => {
  const folder = mkdtempSync(path.join(tmpdir(), 'groundsill-tiles-'));
  let count = 0;
  let basemap: Basemap;

  beforeAll(() => {
    writeFileSync(path.join(folder, 'left-over.pbf'), '');
    count = writeTiles(makeTown(1500, 7), folder);
    basemap = basemapSchema.parse(
      JSON.parse(readFileSync(path.join(folder, 'tiles.json'), 'utf8')),
    );
  });
  afterAll(() => {
    rmSync(folder, { recursive: true });
  });

  function fileOf({ z, x, y }: { z: number; x: number; y: number }): string {
    return path.join(folder, `${z}/${x}/${y}.pbf`);
  }
  function tilesAt(z: number) {
    return tilesWithin(basemap.bounds, z);
  }
  function layersAt(z: number): Set<string> {
    return new Set(tilesAt(z).flatMap((tile) => Object.keys(readTile(readFileSync(fileOf(tile))))));
  }

  it('are all there within the bounds that are told', () => {
    const { minzoom, maxzoom } = basemap;
    const zooms = Array.from({ length: maxzoom - minzoom + 1 }, (_, index) => minzoom + index);
    const tiles = zooms.flatMap(tilesAt);
    expect(tiles.filter((tile) => !existsSync(fileOf(tile)))).toEqual([]);
    expect(tiles).toHaveLength(count);
  });

  it('hold every layer from close by, and less from afar', () => {
    expect(layersAt(16)).toEqual(new Set(BASEMAP_LAYERS));
    expect(layersAt(11)).toEqual(new Set(['water', 'land', 'parks', 'streets']));
  });

  it('are small', () => {
    const sizes = tilesAt(16).map((tile) => readFileSync(fileOf(tile)).byteLength);
    expect(Math.max(...sizes)).toBeLessThan(60_000);
  });

  it('take the place of what was there before', () => {
    expect(existsSync(path.join(folder, 'left-over.pbf'))).toBe(false);
  });

  it('name the harbour inside its quays', () => {
    const places = tilesAt(16).flatMap((tile) => readTile(readFileSync(fileOf(tile))).places ?? []);
    expect(places.map(({ properties }) => properties.name)).toContain('Old Harbour');
  });
});
