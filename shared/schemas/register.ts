import { z } from 'zod';
import { BUILDING_FIELD_NAMES } from './building-fields.ts';
import { jsonText } from './json-text.ts';
import { mapOutlineSchema } from './map-outline.ts';
import { RESULT_COLUMN_NAMES, resultColumnsShape } from './result-columns.ts';
import { STANDING_COLUMN_NAMES, standingColumnsShape } from './standing-columns.ts';

const text = z.string().max(300);

/**
 * What can be known or not of a building in the register: what the newest complete run found, where it
 * stands on the assessors' list, and its fields.
 *
 * Units: of BUILDING_FIELDS, RESULT_COLUMNS and STANDING_COLUMNS. Valid: read only. Source: [own].
 */
export const REGISTER_FIELDS = [
  ...RESULT_COLUMN_NAMES,
  ...STANDING_COLUMN_NAMES,
  ...BUILDING_FIELD_NAMES,
] as const;

/**
 * One of what can be known or not of a building in the register.
 *
 * Units: none. Valid: of REGISTER_FIELDS. Source: [own].
 */
export type RegisterField = (typeof REGISTER_FIELDS)[number];

const registerField = z.enum(REGISTER_FIELDS);

/**
 * What the register's table can show and be ordered by.
 *
 * Units: area m². Valid: read only. Source: [own].
 */
export const REGISTER_COLUMNS = ['reference', 'area', ...REGISTER_FIELDS] as const;

/**
 * One column of the register.
 *
 * Units: none. Valid: of REGISTER_COLUMNS. Source: [own].
 */
export type RegisterColumn = (typeof REGISTER_COLUMNS)[number];

/**
 * One column of the register by its name.
 *
 * Units: none. Valid: of REGISTER_COLUMNS. Source: [own].
 */
export const registerColumnSchema = z.enum(REGISTER_COLUMNS);

/**
 * The most buildings that a filter names one by one.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const MOST_NAMED_BUILDINGS = 5000;

const named = z.array(z.number().int().positive()).max(MOST_NAMED_BUILDINGS);

/**
 * Which buildings of a register are meant: all conditions together; an empty filter means all of them.
 *
 * Units: ranges in the unit of their column; within is west, south, east, north in degrees. Valid: `any` holds
 * the wanted values of a field, null for unknown, those of results as text; `assumed` tells whether the method
 * has to assume something; `ids` are the only ones meant, `except` are left out. Source: [own].
 */
export const registerFilterSchema = z.strictObject({
  search: z
    .string()
    .trim()
    .max(200)
    .regex(/^\P{Cc}*$/u)
    .optional(),
  any: z.partialRecord(registerField, z.array(text.nullable()).min(1).max(50)).optional(),
  ranges: z
    .partialRecord(
      registerColumnSchema,
      z.strictObject({ from: z.number().optional(), to: z.number().optional() }),
    )
    .optional(),
  unknown: z.array(registerField).max(40).optional(),
  assumed: z.boolean().optional(),
  importId: z.uuid().optional(),
  within: z.tuple([z.number(), z.number(), z.number(), z.number()]).optional(),
  inside: mapOutlineSchema.optional(),
  ids: named.optional(),
  except: named.optional(),
});

/**
 * Which buildings of a register are meant.
 *
 * Units: as registerFilterSchema. Valid: parsed by it. Source: [own].
 */
export type RegisterFilter = z.infer<typeof registerFilterSchema>;

/**
 * The order of the register: by one column, then by reference; unknown values come last.
 *
 * Units: none. Valid: of REGISTER_COLUMNS. Source: [own].
 */
export const registerSortSchema = z.strictObject({
  column: registerColumnSchema,
  descending: z.boolean(),
});

/**
 * The order of the register.
 *
 * Units: none. Valid: parsed by registerSortSchema. Source: [own].
 */
export type RegisterSort = z.infer<typeof registerSortSchema>;

/**
 * The order where none is asked for.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const REGISTER_ORDER: RegisterSort = { column: 'reference', descending: false };

/**
 * The most rows that one request gives.
 *
 * Units: rows. Valid: read only. Source: [own].
 */
export const MOST_REGISTER_ROWS = 200;

const which = {
  filter: jsonText(registerFilterSchema, {}),
  sort: jsonText(registerSortSchema, REGISTER_ORDER),
};

/**
 * What a page of the register is asked by.
 *
 * Units: rows. Valid: offset from nought. Source: [own].
 */
export const registerQuerySchema = z.object({
  ...which,
  offset: z.coerce.number().int().min(0).max(10_000_000).default(0),
  limit: z.coerce.number().int().min(1).max(MOST_REGISTER_ROWS).default(100),
});

/**
 * Asks where in the filtered and ordered register one building stands.
 *
 * Units: none. Valid: any building's number. Source: [own].
 */
export const registerPlaceQuerySchema = z.object({
  ...which,
  buildingId: z.coerce.number().int().min(1).max(2_147_483_647),
});

/**
 * Asks for the numbers of the buildings that a filter means, for the map.
 *
 * Units: none. Valid: any filter. Source: [own].
 */
export const registerIdsQuerySchema = z.object({ filter: which.filter });

/**
 * The formats that what is seen of the register is exported in.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const EXPORT_FORMATS = ['xlsx', 'csv', 'geojson'] as const;

/**
 * What an export is asked by.
 *
 * Units: none. Valid: at least one column. Source: [own].
 */
export const registerExportQuerySchema = z.object({
  ...which,
  format: z.enum(EXPORT_FORMATS),
  columns: jsonText(z.array(registerColumnSchema).min(1).max(REGISTER_COLUMNS.length), [
    ...REGISTER_COLUMNS,
  ]),
});

/**
 * What a method has to assume of a building for want of a value.
 *
 * Units: none. Valid: names of KnownAttributes. Source: [own].
 */
export const ASSUMABLE = ['storeys', 'eavesHeight', 'foundingDepth', 'eOverG', 'poisson'] as const;

/**
 * Where a building's ground level comes from: a file, somebody's hand, or the scheme's ground; null where
 * there is none.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const GROUND_LEVEL_FROM = ['file', 'hand', 'ground'] as const;

const value = { text: z.string().nullable(), number: z.number().nullable() };

/**
 * The fields of a building as they are answered; null is unknown.
 *
 * Units: of BUILDING_FIELDS, area m². Valid: `assumed` names what the method fills in. Source: [own].
 */
export const buildingValuesShape = {
  name: value.text,
  address: value.text,
  use: value.text,
  storeys: value.number,
  eavesHeight: value.number,
  groundLevel: value.number,
  foundingLevel: value.number,
  foundation: value.text,
  construction: value.text,
  eOverG: value.number,
  poisson: value.number,
  listedGrade: value.text,
  condition: value.text,
  inspected: value.text,
  structureScore: value.number,
  structureReason: value.text,
  featuresScore: value.number,
  featuresReason: value.text,
  area: z.number(),
  groundLevelFrom: z.enum(GROUND_LEVEL_FROM).nullable(),
  assumed: z.array(z.enum(ASSUMABLE)),
  version: z.number(),
};

/**
 * One row of the register, with what the newest complete run found and where it stands.
 *
 * Units: as buildingValuesShape, resultColumnsShape and standingColumnsShape; centre is longitude and latitude in degrees.
 * Valid: read only. Source: [own].
 */
export const registerRowSchema = z.strictObject({
  id: z.number(),
  reference: z.string(),
  centre: z.tuple([z.number(), z.number()]),
  ...buildingValuesShape,
  ...resultColumnsShape,
  ...standingColumnsShape,
});

/**
 * One row of the register.
 *
 * Units: as registerRowSchema. Valid: parsed by it. Source: [own].
 */
export type RegisterRow = z.infer<typeof registerRowSchema>;

/**
 * A page of the register, with how many there are by the filter and in all, and which run its results are of.
 *
 * Units: none. Valid: version is the scheme's registerVersion; run is null where none is complete.
 * Source: [own].
 */
export const registerPageSchema = z.strictObject({
  rows: z.array(registerRowSchema),
  found: z.number(),
  all: z.number(),
  version: z.number(),
  run: z.uuid().nullable(),
});

/**
 * A page of the register.
 *
 * Units: none. Valid: parsed by registerPageSchema. Source: [own].
 */
export type RegisterPage = z.infer<typeof registerPageSchema>;

/**
 * Where a building stands in the filtered and ordered register, from nought; null where it is not in it.
 *
 * Units: rows. Valid: of the moment. Source: [own].
 */
export const registerPlaceSchema = z.strictObject({ index: z.number().nullable() });

/**
 * Numbers of buildings.
 *
 * Units: none. Valid: ascending. Source: [own].
 */
export const registerIdsSchema = z.strictObject({ ids: z.array(z.number()) });

/**
 * Which values a field has in a register, the commonest first, for filters to offer.
 *
 * Units: counts of buildings. Valid: at most 50 values; null is unknown. Source: [own].
 */
export const registerChoicesSchema = z.array(
  z.strictObject({ value: z.string().nullable(), count: z.number() }),
);

/**
 * Asks for the values of one field.
 *
 * Units: none. Valid: a field of the register. Source: [own].
 */
export const registerChoicesParamsSchema = z.object({ schemeId: z.string(), field: registerField });
