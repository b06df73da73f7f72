import type { LonLatBounds } from '../../shared/schemas/basemap.ts';

export type Tile = { readonly z: number; readonly x: number; readonly y: number };

function column(longitude: number, z: number): number {
  return Math.floor(((longitude + 180) / 360) * 2 ** z);
}

function row(latitude: number, z: number): number {
  const sine = Math.sin((latitude * Math.PI) / 180);
  const fraction = 0.5 - Math.log((1 + sine) / (1 - sine)) / (4 * Math.PI);
  return Math.floor(fraction * 2 ** z);
}

/** Every tile of one zoom that touches the bounds. */
export function tilesWithin([west, south, east, north]: LonLatBounds, z: number): Tile[] {
  const tiles: Tile[] = [];
  for (let x = column(west, z); x <= column(east, z); x += 1) {
    for (let y = row(north, z); y <= row(south, z); y += 1) tiles.push({ z, x, y });
  }
  return tiles;
}
