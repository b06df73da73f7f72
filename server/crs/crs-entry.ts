import { z } from 'zod';

/** A system as the index of EPSG systems holds it. */
export const crsEntrySchema = z.object({
  code: z.coerce.number(),
  kind: z.string(),
  name: z.string(),
  proj4: z.string().nullable(),
  /** North, west, south, east. */
  bbox: z.tuple([z.number(), z.number(), z.number(), z.number()]),
  unit: z.string().nullable(),
  area: z.string().nullable(),
  wkt: z.string().nullable(),
  /** In metres, of the shift to WGS 84. */
  accuracy: z.number().nullable(),
});

export type CrsEntry = z.infer<typeof crsEntrySchema>;
