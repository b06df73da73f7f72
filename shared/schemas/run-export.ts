import { z } from 'zod';

/**
 * The formats that all that a run found is exported in.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const RUN_EXPORT_FORMATS = ['xlsx', 'geojson'] as const;

/**
 * What an export of a run is asked by.
 *
 * Units: none. Valid: of RUN_EXPORT_FORMATS. Source: [own].
 */
export const runExportQuerySchema = z.object({ format: z.enum(RUN_EXPORT_FORMATS) });
