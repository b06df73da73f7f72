import type { LonLatBox } from '../models/find-buildings-in-box.ts';

export type TilePlace = { readonly z: number; readonly x: number; readonly y: number };

/** Tiles carry what lies so far outside them, as a share of their width, so that edges are not drawn. */
export const TILE_MARGIN = 64 / 4096;

function latitudeAt(y: number): number {
  return (Math.atan(Math.sinh(Math.PI * (1 - 2 * y))) * 180) / Math.PI;
}

/** The box of a tile of the web map with its margin, in degrees. */
export function tileBounds({ z, x, y }: TilePlace): LonLatBox {
  const tiles = 2 ** z;
  const longitudeAt = (column: number) => (column / tiles) * 360 - 180;
  return [
    longitudeAt(x - TILE_MARGIN),
    latitudeAt((y + 1 + TILE_MARGIN) / tiles),
    longitudeAt(x + 1 + TILE_MARGIN),
    latitudeAt((y - TILE_MARGIN) / tiles),
  ];
}
