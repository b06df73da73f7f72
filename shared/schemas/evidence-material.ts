import { z } from 'zod';
import { backgroundLayerSchema } from './background.ts';
import { LIMITS } from './limits.ts';
import { runDetailSchema, runFactsSchema, runResultSchema } from './runs.ts';

/**
 * How much ground a sheet may show, and how much may stand on it.
 *
 * Units: side m, pieces. Valid: read only. Source: [own]; an A0 sheet at 1 : 50 000 lying askew.
 */
export const MATERIAL_LIMITS = { side: 80_000, buildings: 20_000, background: 20_000 } as const;

const coordinate = z.coerce.number().min(-LIMITS.coordinate).max(LIMITS.coordinate);

/**
 * The ground of a sheet on the scheme's grid.
 *
 * Units: easting and northing m. Valid: west < east and south < north, sides up to MATERIAL_LIMITS.
 * Source: [own].
 */
export const materialBoxSchema = z
  .object({ west: coordinate, south: coordinate, east: coordinate, north: coordinate })
  .refine(({ west, east }) => west < east && east - west <= MATERIAL_LIMITS.side, {
    path: ['east'],
    error: `East has to lie up to ${MATERIAL_LIMITS.side / 1000} km beyond west.`,
  })
  .refine(({ south, north }) => south < north && north - south <= MATERIAL_LIMITS.side, {
    path: ['north'],
    error: `North has to lie up to ${MATERIAL_LIMITS.side / 1000} km beyond south.`,
  });

const planPoint = z.tuple([z.number(), z.number()]);
const background = z.array(
  z.strictObject({
    layer: backgroundLayerSchema,
    name: z.string().nullable(),
    isArea: z.boolean(),
    lines: z.array(z.array(planPoint)),
  }),
);

/**
 * All that plans of a run are drawn from, within some ground.
 *
 * Units: as PlanMaterial. Valid: buildings by reference, at most MATERIAL_LIMITS; some that stand close to
 * the ground may be among them. Source: [own].
 */
export const planMaterialSchema = z.strictObject({
  material: z.strictObject({
    buildings: z.array(
      z.strictObject({
        id: z.string(),
        ...runFactsSchema.pick({ reference: true, address: true, parts: true }).shape,
        result: z.strictObject(
          runResultSchema.pick({
            stage: true,
            categoryLow: true,
            category: true,
            categoryHigh: true,
            settlement: true,
            strain: true,
            breakpointVolumeLoss: true,
          }).shape,
        ),
      }),
    ),
    background,
    contours: z.array(
      z.strictObject({ level: z.number(), line: z.array(planPoint), isClosed: z.boolean() }),
    ),
  }),
});

/**
 * What every sheet of a run says of itself but the fields of its title block and when it was printed.
 *
 * Units: as AboutSheets. Valid: a complete run. Source: [own].
 */
export const aboutSheetsSchema = z.strictObject({
  scheme: z.strictObject({
    name: z.string(),
    crs: z.strictObject({ code: z.number(), name: z.string() }),
  }),
  run: runDetailSchema,
  keyGround: background,
});
