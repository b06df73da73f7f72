import { z } from 'zod';

/**
 * The most systems that a search answers with.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const MOST_CRS = 30;

/**
 * What a system is wanted for: a scheme is drawn on one in true metres, a file may come in degrees or in
 * feet as well.
 *
 * Units: none. Valid: a scheme where nothing is said. Source: [own].
 */
export const crsPurposeSchema = z.object({ for: z.enum(['scheme', 'file']).default('scheme') });

/**
 * What a system is wanted for.
 *
 * Units: none. Valid: parsed by crsPurposeSchema. Source: [own].
 */
export type CrsPurpose = z.infer<typeof crsPurposeSchema>['for'];

/**
 * Words to find a system by: its EPSG number, its name or where it is used.
 *
 * Units: none. Valid: nothing finds nothing. Source: [own].
 */
export const crsSearchSchema = crsPurposeSchema.extend({
  search: z.string().trim().max(200).default(''),
});

/**
 * The address of one system.
 *
 * Units: an EPSG number. Valid: whole numbers of the EPSG range. Source: [own].
 */
export const crsParamsSchema = z.object({ code: z.coerce.number().int().min(1024).max(32767) });

const crsRow = { code: z.number(), name: z.string(), area: z.string() };

/**
 * The systems found, the best first.
 *
 * Units: code is an EPSG number. Valid: for schemes projected, in metres, axes east and north; for files in
 * feet or degrees too. Source: [own].
 */
export const crsListSchema = z.array(z.strictObject(crsRow));

/**
 * One system, ready for proj4.
 *
 * Units: bounds are west, south, east, north in degrees. Valid: west is greater than east where the
 * system crosses the date line. Source: [own].
 */
export const crsSchema = z.strictObject({
  ...crsRow,
  definition: z.string(),
  bounds: z.tuple([z.number(), z.number(), z.number(), z.number()]),
});

/**
 * One system, ready for proj4.
 *
 * Units: as crsSchema. Valid: parsed by it. Source: [own].
 */
export type CrsAnswer = z.infer<typeof crsSchema>;

/**
 * One row of a search for systems.
 *
 * Units: code is an EPSG number. Valid: parsed by crsListSchema. Source: [own].
 */
export type CrsRow = z.infer<typeof crsListSchema>[number];
