import type { LonLatBounds } from '../../../../shared/schemas/basemap.ts';

type Size = { readonly width: number; readonly height: number };
type Tiles = {
  readonly minzoom: number;
  readonly maxzoom: number;
  /** Outside of these there are none; null where nobody knows how far they go. */
  readonly bounds: LonLatBounds | null;
};

/** A tile and where its corner lies in the picture, in pixels. */
export type PlacedTile = {
  readonly z: number;
  readonly x: number;
  readonly y: number;
  readonly left: number;
  readonly top: number;
  /** The side of the tile in the picture. */
  readonly side: number;
};

/** A small picture of a place on the map of the world. */
export type PictureFrame = Size & {
  /** Corner and width of the world, in pixels of the picture. */
  readonly left: number;
  readonly top: number;
  readonly world: number;
  readonly pixelsPerMetre: number;
};

/** The side of a tile at which its zoom is meant. */
const TILE = 512;
const EQUATOR_METRES = 40_075_016;
/** More tiles than these are no small picture of a town. */
const MOST_TILES = 9;
/** At least a third of the longer side is in the picture. */
const MOST_CUT = 3;

function across(longitude: number): number {
  return (longitude + 180) / 360;
}

function down(latitude: number): number {
  const radians = (latitude * Math.PI) / 180;
  return (1 - Math.asinh(Math.tan(radians)) / Math.PI) / 2;
}

/** The frame that is filled by what lies within bounds; what is too long for it is cut at its ends, but not to a stump. */
export function pictureFrame([west, south, east, north]: LonLatBounds, size: Size): PictureFrame {
  const [x0, x1, y0, y1] = [across(west), across(east), down(north), down(south)];
  const fits = [size.width / (x1 - x0), size.height / (y1 - y0)];
  const world = Math.min(Math.max(...fits), MOST_CUT * Math.min(...fits));
  const latitude = (((south + north) / 2) * Math.PI) / 180;
  return {
    ...size,
    world,
    left: ((x0 + x1) / 2) * world - size.width / 2,
    top: ((y0 + y1) / 2) * world - size.height / 2,
    pixelsPerMetre: world / (EQUATOR_METRES * Math.cos(latitude)),
  };
}

/** Where a place of the world lies in a picture, in pixels. */
export function placeInPicture(
  { left, top, world }: PictureFrame,
  [longitude, latitude]: readonly [number, number],
): [x: number, y: number] {
  return [across(longitude) * world - left, down(latitude) * world - top];
}

function isWithin({ z, x, y }: PlacedTile, [west, south, east, north]: LonLatBounds): boolean {
  const count = 2 ** z;
  return (
    x < across(east) * count &&
    x + 1 > across(west) * count &&
    y < down(south) * count &&
    y + 1 > down(north) * count
  );
}

/** The tiles of a set that the frame shows; none where they would be too many. */
export function tilesInFrame(frame: PictureFrame, tiles: Tiles): PlacedTile[] {
  const { minzoom, maxzoom, bounds } = tiles;
  const { left, top, width, height, world } = frame;
  const z = Math.min(maxzoom, Math.max(minzoom, Math.round(Math.log2(world / TILE))));
  const side = world / 2 ** z;
  const [firstX, firstY] = [Math.floor(left / side), Math.floor(top / side)];
  const columns = Math.ceil((left + width) / side) - firstX;
  const rows = Math.ceil((top + height) / side) - firstY;
  if (columns * rows > MOST_TILES) return [];
  const placed = Array.from({ length: columns * rows }, (_, index) => {
    const x = firstX + (index % columns);
    const y = firstY + Math.floor(index / columns);
    return { z, x, y, side, left: x * side - left, top: y * side - top };
  });
  return bounds === null ? placed : placed.filter((tile) => isWithin(tile, bounds));
}
