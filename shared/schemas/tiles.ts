import { z } from 'zod';

/**
 * Between which zooms there are tiles of buildings; closer in the client stretches the last ones.
 *
 * Units: zoom levels of tiles of 512 pixels. Valid: read only. Source: [own].
 */
export const BUILDING_ZOOMS = { least: 13, most: 17 } as const;

/**
 * Between which zooms there are tiles of streets, water, rail and parks.
 *
 * Units: zoom levels of tiles of 512 pixels. Valid: read only. Source: [own].
 */
export const BACKGROUND_ZOOMS = { least: 10, most: 16 } as const;

function tileParams({ least, most }: { readonly least: number; readonly most: number }) {
  const whole = z.coerce.number().int().min(0);
  return z
    .object({
      schemeId: z.string(),
      version: whole.max(2_147_483_647),
      z: whole.min(least).max(most),
      x: whole,
      y: whole,
    })
    .refine((tile) => Math.max(tile.x, tile.y) < 1 << tile.z);
}

/**
 * The address of a tile of buildings; the version is the scheme's registerVersion.
 *
 * Units: none. Valid: zooms of BUILDING_ZOOMS, x and y on the map. Source: [own].
 */
export const buildingTileSchema = tileParams(BUILDING_ZOOMS);

/**
 * The address of a tile of an import's footprints; the version is the import's.
 *
 * Units: none. Valid: zooms of BUILDING_ZOOMS, x and y on the map. Source: [own].
 */
export const importTileSchema = tileParams(BUILDING_ZOOMS).and(z.object({ importId: z.uuid() }));

/**
 * The address of a tile of the background; the version is the scheme's backgroundVersion.
 *
 * Units: none. Valid: zooms of BACKGROUND_ZOOMS, x and y on the map. Source: [own].
 */
export const backgroundTileSchema = tileParams(BACKGROUND_ZOOMS);
