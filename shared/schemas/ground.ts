import { z } from 'zod';

/**
 * What may be sent of a scheme's ground.
 *
 * Units: bytes and points. Valid: read only. Source: [own].
 */
export const GROUND_LIMITS = {
  bytes: 50 * 1024 * 1024,
  spots: 500_000,
  cells: 25_000_000,
} as const;

const source = z
  .string()
  .trim()
  .min(1, 'Say where the levels come from.')
  .max(200)
  .regex(/^\P{Cc}*$/u);

/**
 * One level for a whole scheme.
 *
 * Units: m above datum. Valid: a source in words. Source: [own].
 */
export const groundLevelSchema = z.strictObject({
  level: z.number('Write a number.').min(-500).max(9000),
  source,
});

/**
 * What goes with an uploaded file of levels, as text beside it: where the levels come from, and which
 * grid its points are in.
 *
 * Units: crs is an EPSG number. Valid: the scheme's grid where none is given. Source: [own].
 */
export const groundFileQuerySchema = z.object({
  source,
  crs: z.coerce.number().int().optional(),
});

/**
 * A scheme's ground and how many buildings took their level from it.
 *
 * Units: levels m above datum; counts. Valid: null where none was given; spots are joined by triangles
 * and levels read on them, grids between the four nearest cells. Source: [own].
 */
export const groundSchema = z.strictObject({
  ground: z
    .strictObject({
      kind: z.enum(['level', 'spots', 'grid']),
      source: z.string(),
      by: z.string().nullable(),
      at: z.string(),
      points: z.number(),
      lowest: z.number(),
      highest: z.number(),
    })
    .nullable(),
  buildings: z.strictObject({
    fromGround: z.number(),
    fromFile: z.number(),
    byHand: z.number(),
    unknown: z.number(),
  }),
});

/**
 * A scheme's ground.
 *
 * Units: as groundSchema. Valid: parsed by it. Source: [own].
 */
export type GroundAnswer = z.infer<typeof groundSchema>;
