import type { Feature } from 'geojson';
import type { Sequelize } from 'sequelize';
import { BACKGROUND_LAYERS } from '../../shared/schemas/background.ts';
import { BACKGROUND_ZOOMS } from '../../shared/schemas/tiles.ts';
import { findBackgroundInBox, type DrawnBackground } from '../models/find-background-in-box.ts';
import { encodeTile } from './encode-tile.ts';
import { tileBounds, type TilePlace } from './tile-bounds.ts';

/** Tiles are drawn 512 pixels wide; what is under a pixel is not seen. */
const PIXELS = 512;
/** Half a pixel, in 4096ths of the tile. */
const TOLERANCE = 4;

function featureOf({ name, geometry }: DrawnBackground): Feature {
  return { type: 'Feature', properties: name === null ? {} : { name }, geometry };
}

/** A tile of a scheme's background. Far out it leaves away what cannot be seen. */
export async function backgroundTile(
  database: Sequelize,
  schemeId: string,
  place: TilePlace,
): Promise<Buffer> {
  const isClosest = place.z === BACKGROUND_ZOOMS.most;
  const least = isClosest ? 0 : 360 / 2 ** place.z / PIXELS;
  const drawn = await findBackgroundInBox(database, schemeId, tileBounds(place), { least });
  const layers = BACKGROUND_LAYERS.map((layer) => {
    return [layer, drawn.filter((one) => one.layer === layer).map(featureOf)] as const;
  });
  return encodeTile(Object.fromEntries(layers), place, isClosest ? 0 : TOLERANCE);
}
