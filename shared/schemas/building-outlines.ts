import { z } from 'zod';
import { footprintSchema } from './building-fields.ts';
import { LIMITS } from './limits.ts';

/**
 * How large a box may be whose outlines are asked for, and how many are answered at most.
 *
 * Units: m, pieces. Valid: read only. Source: [own]; no town has so many buildings on so little ground.
 */
export const OUTLINE_LIMITS = { side: 500, buildings: 5000 } as const;

const coordinate = z.coerce.number().min(-LIMITS.coordinate).max(LIMITS.coordinate);

/**
 * A box of the scheme's grid.
 *
 * Units: easting and northing m. Valid: west < east and south < north, sides up to OUTLINE_LIMITS.
 * Source: [own].
 */
export const outlineBoxSchema = z
  .object({ west: coordinate, south: coordinate, east: coordinate, north: coordinate })
  .refine(({ west, east }) => west < east && east - west <= OUTLINE_LIMITS.side, {
    path: ['east'],
    error: `East has to lie up to ${OUTLINE_LIMITS.side} m beyond west.`,
  })
  .refine(({ south, north }) => south < north && north - south <= OUTLINE_LIMITS.side, {
    path: ['north'],
    error: `North has to lie up to ${OUTLINE_LIMITS.side} m beyond south.`,
  });

/**
 * A box of the scheme's grid.
 *
 * Units: as outlineBoxSchema. Valid: parsed by it. Source: [own].
 */
export type OutlineBox = z.infer<typeof outlineBoxSchema>;

/**
 * A building as it stands on the ground: its outline and how high it is to the eaves.
 *
 * Units: footprint easting and northing m; eavesHeight m above ground. Valid: eavesHeight and storeys are
 * null where unknown. Source: [own].
 */
export const buildingOutlineSchema = z.strictObject({
  id: z.number(),
  reference: z.string(),
  name: z.string().nullable(),
  storeys: z.number().nullable(),
  eavesHeight: z.number().nullable(),
  footprint: footprintSchema,
});

/**
 * The buildings in a box; some that stand close to it may be among them.
 *
 * Units: as buildingOutlineSchema. Valid: at most OUTLINE_LIMITS of them. Source: [own].
 */
export const buildingOutlinesSchema = z.array(buildingOutlineSchema);

/**
 * A building as it stands on the ground.
 *
 * Units: as buildingOutlineSchema. Valid: parsed by it. Source: [own].
 */
export type BuildingOutline = z.infer<typeof buildingOutlineSchema>;
