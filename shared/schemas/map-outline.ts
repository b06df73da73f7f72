import { z } from 'zod';

/**
 * How many corners an outline drawn on the map may have.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const OUTLINE_CORNERS = { least: 3, most: 200 } as const;

const corner = z.tuple([z.number().min(-180).max(180), z.number().min(-90).max(90)]);

/**
 * An outline drawn on the map; its last corner is joined to its first.
 *
 * Units: longitude and latitude in degrees. Valid: as many corners as OUTLINE_CORNERS says; it may cross
 * itself. Source: [own].
 */
export const mapOutlineSchema = z
  .array(corner)
  .min(OUTLINE_CORNERS.least, 'Set at least three corners.')
  .max(OUTLINE_CORNERS.most, `At most ${OUTLINE_CORNERS.most} corners.`);
