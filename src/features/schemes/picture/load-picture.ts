import { VectorTile } from '@mapbox/vector-tile';
import { PbfReader } from 'pbf';
import type { ExtentAnswer } from '../../../../shared/schemas/buildings.ts';
import type { MapPlan, TileSet } from '../../map/map-plan.ts';
import { pictureFrame, tilesInFrame, type PictureFrame, type PlacedTile } from './picture-frame.ts';
import { BACKGROUND_LOOKS, BASEMAP_LOOKS, BUILDING_LOOKS, type Look } from './picture-looks.ts';

type Sheet = { readonly tile: VectorTile; readonly place: PlacedTile };

/** Sheets of tiles that are drawn alike. */
export type PictureLayer = { readonly looks: readonly Look[]; readonly sheets: readonly Sheet[] };

export type Picture = { readonly frame: PictureFrame; readonly layers: readonly PictureLayer[] };

type Size = { readonly width: number; readonly height: number };

/** A tile that is not there is empty: the sea has none. */
async function loadSheet(url: string, place: PlacedTile, signal: AbortSignal): Promise<Sheet[]> {
  const address = url
    .replace('{z}', String(place.z))
    .replace('{x}', String(place.x))
    .replace('{y}', String(place.y));
  const response = await fetch(address, { signal });
  if (!response.ok) return [];
  const bytes = new Uint8Array(await response.arrayBuffer());
  return [{ place, tile: new VectorTile(new PbfReader(bytes)) }];
}

async function loadLayer(
  tiles: TileSet | null,
  looks: readonly Look[],
  frame: PictureFrame,
  signal: AbortSignal,
): Promise<PictureLayer> {
  if (tiles === null) return { looks, sheets: [] };
  const places = tilesInFrame(frame, tiles);
  const sheets = await Promise.all(places.map((place) => loadSheet(tiles.url, place, signal)));
  return { looks, sheets: sheets.flat() };
}

/** Fetches what a small picture of a scheme shows: its ground and its buildings. */
export async function loadPicture(
  { basemap, background, buildings }: MapPlan,
  { bounds }: ExtentAnswer,
  size: Size,
  signal: AbortSignal,
): Promise<Picture> {
  const frame = pictureFrame(bounds, size);
  const layers = await Promise.all([
    loadLayer(basemap, BASEMAP_LOOKS, frame, signal),
    loadLayer(background, BACKGROUND_LOOKS, frame, signal),
    loadLayer(buildings, BUILDING_LOOKS, frame, signal),
  ]);
  return { frame, layers };
}
