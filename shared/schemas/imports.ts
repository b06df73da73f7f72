import { z } from 'zod';
import { BUILDING_FIELD_NAMES, footprintSchema } from './building-fields.ts';

/**
 * What an upload of buildings may be at most.
 *
 * Units: bytes, rows, columns. Valid: read only. Source: [own].
 */
export const IMPORT_LIMITS = {
  bytes: 200 * 1024 * 1024,
  rows: 200_000,
  columns: 200,
  corners: 10_000,
} as const;

/**
 * The formats that buildings come in, as people call them.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const IMPORT_FORMATS = {
  geojson: 'GeoJSON',
  shapefile: 'Shapefile',
  geopackage: 'GeoPackage',
  cityjson: 'CityJSON',
  csv: 'CSV',
  xlsx: 'XLSX',
} as const;

const formatName = z.enum(['geojson', 'shapefile', 'geopackage', 'cityjson', 'csv', 'xlsx']);

/**
 * How far an import is. `asking` waits for the person, with a check done or with what is missing to do it.
 *
 * Units: none. Valid: closed list; only `asking` may be changed or confirmed. Source: [own].
 */
export const IMPORT_STATES = [
  'reading',
  'checking',
  'asking',
  'importing',
  'done',
  'cancelled',
  'failed',
] as const;

/**
 * The fields that a column may fill.
 *
 * Units: none. Valid: reference or a field of the register. Source: [own].
 */
export const IMPORT_FIELDS = ['reference', ...BUILDING_FIELD_NAMES] as const;

const importField = z.enum(IMPORT_FIELDS);

/**
 * Where coordinates of a file lie: an EPSG number, whether the two axes have to be exchanged, and a stated
 * shift after they were brought to the scheme's grid.
 *
 * Units: shift east and north in m. Valid: crs null while nobody knows it. Source: [own].
 */
export const importPlaceSchema = z.strictObject({
  crs: z.number().int().nullable(),
  exchangeAxes: z.boolean(),
  shift: z.tuple([z.number().min(-2000).max(2000), z.number().min(-2000).max(2000)]),
});

/**
 * What a person chooses of an import: where, which layer, which column fills which field, whether crossing rings are
 * mended and how a value that changed both here and in the file is settled.
 *
 * Units: none. Valid: `columns` by field; a footprint file without a column for reference gets numbers
 * with `prefix`; settle by building reference, for all fields of it in conflict. Source: [own].
 */
export const importOptionsSchema = z.strictObject({
  place: importPlaceSchema,
  columns: z.partialRecord(importField, z.string().max(300)),
  prefix: z
    .string()
    .trim()
    .max(20)
    .regex(/^\P{Cc}*$/u),
  mend: z.boolean(),
  /** Another layer to read; where it is left out, the one that was read stays. */
  layer: z.string().max(300).optional(),
  settle: z.strictObject({
    others: z.enum(['ask', 'keep ours', 'take theirs']),
    rows: z.record(z.string().max(60), z.enum(['keep ours', 'take theirs'])),
  }),
});

/**
 * What a person chooses of an import.
 *
 * Units: as importOptionsSchema. Valid: parsed by it. Source: [own].
 */
export type ImportOptions = z.infer<typeof importOptionsSchema>;

/**
 * A change of what was chosen, on top of the version that was seen.
 *
 * Units: none. Valid: while the import asks. Source: [own].
 */
export const changeImportSchema = z.strictObject({
  version: z.number().int().min(1),
  options: importOptionsSchema,
});

/**
 * Confirms an import as it was checked.
 *
 * Units: none. Valid: the version that was seen, nothing left to settle. Source: [own].
 */
export const confirmImportSchema = z.strictObject({ version: z.number().int().min(1) });

/**
 * The address of an import.
 *
 * Units: none. Valid: an import of the scheme. Source: [own].
 */
export const importParamsSchema = z.object({ schemeId: z.string(), importId: z.uuid() });

/**
 * What becomes of a row: a new building, a changed one, one that stays as it is, one where both the
 * register and the file changed a value, or none because something is wrong with it.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const ROW_OUTCOMES = ['new', 'changed', 'same', 'conflict', 'refused'] as const;

const outcome = z.enum(ROW_OUTCOMES);

/**
 * Which rows of a report are asked for.
 *
 * Units: rows. Valid: `noted` means rows with a remark, whatever becomes of them. Source: [own].
 */
export const importRowsQuerySchema = z.object({
  outcome: z.enum([...ROW_OUTCOMES, 'noted']).optional(),
  offset: z.coerce.number().int().min(0).max(10_000_000).default(0),
  limit: z.coerce.number().int().min(1).max(200).default(100),
});

const scalar = z.union([z.string(), z.number(), z.null()]);

/**
 * One row of a report: which, what becomes of it, why, and which values change.
 *
 * Units: centre in degrees, area m². Valid: remarks are whole sentences that say what to do; values by
 * field as they stand here (ours) and in the file (theirs); mended tells that a crossing ring was or can
 * be mended. Source: [own].
 */
export const importRowSchema = z.strictObject({
  row: z.number(),
  reference: z.string().nullable(),
  outcome,
  remarks: z.array(z.string()),
  changes: z.array(
    z.strictObject({
      field: z.string(),
      ours: scalar,
      theirs: scalar,
      isConflict: z.boolean(),
      isKept: z.boolean(),
    }),
  ),
  centre: z.tuple([z.number(), z.number()]).nullable(),
  area: z.number().nullable(),
  isMended: z.boolean(),
});

/**
 * One row of a report.
 *
 * Units: as importRowSchema. Valid: parsed by it. Source: [own].
 */
export type ImportRow = z.infer<typeof importRowSchema>;

/**
 * A page of a report.
 *
 * Units: none. Valid: rows in the file's order. Source: [own].
 */
export const importRowsSchema = z.strictObject({
  rows: z.array(importRowSchema),
  found: z.number(),
});

/**
 * How a file's place was found and how well it is known.
 *
 * Units: accuracy in m, the worst case of the datum shift between the file's system and the scheme's; 0
 * where they are the same. Valid: `from` tells who says so; `words` is a sentence for people.
 * Source: [own].
 */
export const placeFoundSchema = z.strictObject({
  crs: z.number().int().nullable(),
  name: z.string().nullable(),
  from: z.enum(['the file', 'the format', 'the person', 'nobody']),
  /** Other systems that the file's own words fit. */
  candidates: z.array(z.strictObject({ code: z.number(), name: z.string() })),
  accuracy: z.number().nullable(),
  words: z.string(),
});

const counts = z.strictObject({
  rows: z.number(),
  new: z.number(),
  changed: z.number(),
  same: z.number(),
  conflict: z.number(),
  refused: z.number(),
  noted: z.number(),
  mendable: z.number(),
  /** Of the scheme's buildings, those that no row speaks of. */
  absent: z.number(),
  area: z.number(),
});

/**
 * An import as the person sees it. What is missing before it can be checked stands in `missing`.
 *
 * Units: bounds in degrees; counts of rows; area m². Valid: counts and bounds are null until a check is
 * done; kind `values` joins columns to buildings by reference and has no footprints. Source: [own].
 */
export const importSchema = z.strictObject({
  id: z.uuid(),
  version: z.number(),
  state: z.enum(IMPORT_STATES),
  fileName: z.string(),
  format: formatName.nullable(),
  kind: z.enum(['footprints', 'values']).nullable(),
  layer: z.string().nullable(),
  /** The layers that can be chosen instead, with the one that was read; none where there is no choice. */
  layers: z.array(z.string()),
  by: z.string().nullable(),
  at: z.string(),
  /** Rows done of rows in all, where known. */
  progress: z.strictObject({ done: z.number(), of: z.number().nullable() }),
  columns: z.array(
    z.strictObject({ name: z.string(), filled: z.number(), samples: z.array(z.string()) }),
  ),
  options: importOptionsSchema,
  /** The earlier file with the same columns that the mapping is remembered from, and when it was sent. */
  remembered: z.strictObject({ at: z.string(), fileName: z.string() }).nullable(),
  place: placeFoundSchema.nullable(),
  missing: z.array(z.enum(['crs', 'reference', 'columns', 'settle'])),
  counts: counts.nullable(),
  bounds: z.tuple([z.number(), z.number(), z.number(), z.number()]).nullable(),
  /** Why it failed, for people. */
  fault: z.string().nullable(),
  changeId: z.uuid().nullable(),
});

/**
 * An import as the person sees it.
 *
 * Units: as importSchema. Valid: parsed by it. Source: [own].
 */
export type ImportAnswer = z.infer<typeof importSchema>;

/**
 * The imports of a scheme, the newest first.
 *
 * Units: none. Valid: at most 50. Source: [own].
 */
export const importListSchema = z.array(
  importSchema.pick({ id: true, state: true, fileName: true, by: true, at: true, counts: true }),
);

/**
 * The footprint of a row as it was read and as it would be mended, for showing both.
 *
 * Units: longitude and latitude in degrees. Valid: given only where a ring crosses itself.
 * Source: [own].
 */
export const mendSchema = z.strictObject({
  before: footprintSchema,
  after: footprintSchema.nullable(),
});
