import { z } from 'zod';
import {
  BUILDING_FIELD_NAMES,
  buildingAttributesSchema,
  buildingReferenceSchema,
  drawnFootprintSchema,
} from './building-fields.ts';
import { registerFilterSchema } from './register.ts';

/**
 * The ways in which a register changes.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const REGISTER_CHANGE_KINDS = [
  'import',
  'draw',
  'edit',
  'edit many',
  'split',
  'join',
  'remove',
  'ground',
  'visit',
  'undo',
] as const;

const version = z.number().int().min(1);
const someAttributes = buildingAttributesSchema.refine(
  (attributes) => Object.keys(attributes).length > 0,
  'Change at least one value.',
);

/**
 * A building drawn by hand.
 *
 * Units: as buildingAttributesSchema and drawnFootprintSchema. Valid: a reference that is free.
 * Source: [own].
 */
export const drawBuildingSchema = z.strictObject({
  reference: buildingReferenceSchema,
  footprint: drawnFootprintSchema,
  attributes: buildingAttributesSchema.default({}),
});

/**
 * A change of one building: its reference, values or footprint, on top of the version that was seen.
 *
 * Units: as drawBuildingSchema. Valid: an older version is refused, and what changed is told.
 * Source: [own].
 */
export const editBuildingSchema = z.strictObject({
  version,
  reference: buildingReferenceSchema.optional(),
  attributes: buildingAttributesSchema.optional(),
  footprint: drawnFootprintSchema.optional(),
});

/**
 * The same values for many buildings. `expected` is how many the person was told it would be.
 *
 * Units: as buildingAttributesSchema. Valid: refused where another number is found. Source: [own].
 */
export const editManySchema = z.strictObject({
  filter: registerFilterSchema,
  expected: z.number().int().min(1),
  attributes: someAttributes,
});

/**
 * Asks what many buildings have now where values are to be set.
 *
 * Units: as editManySchema. Valid: as editManySchema. Source: [own].
 */
export const previewManySchema = editManySchema.omit({ expected: true });

/**
 * How many of the buildings have the value already that is to be set, and of how many none is known; a field
 * that is made unknown counts the same ones twice.
 *
 * Units: counts of buildings. Valid: one entry for each field that is to be set. Source: [own].
 */
export const manyPreviewSchema = z.array(
  z.strictObject({ field: z.enum(BUILDING_FIELD_NAMES), same: z.number(), unknown: z.number() }),
);

/**
 * What many buildings have now.
 *
 * Units: as manyPreviewSchema. Valid: parsed by it. Source: [own].
 */
export type ManyPreview = z.infer<typeof manyPreviewSchema>;

/**
 * Takes many buildings out of the register at once. `expected` is how many the person was told it would be.
 *
 * Units: none. Valid: refused where another number is found. Source: [own].
 */
export const removeManySchema = editManySchema.omit({ attributes: true });

/**
 * Cuts a building in two along a line across it.
 *
 * Units: easting and northing m in the scheme's grid. Valid: a line that crosses the footprint from
 * outside to outside; the largest part keeps the reference. Source: [own].
 */
export const splitBuildingSchema = z.strictObject({
  version,
  line: z
    .array(z.tuple([z.number(), z.number()]))
    .min(2)
    .max(200),
});

/**
 * Makes one building of several; the first keeps its reference and values, gaps filled from the others.
 *
 * Units: none. Valid: two to 50 buildings, each with the version that was seen. Source: [own].
 */
export const joinBuildingsSchema = z.strictObject({
  buildings: z
    .array(z.strictObject({ id: z.number().int().positive(), version }))
    .min(2, 'Choose two buildings at least.')
    .max(50),
});

/**
 * Takes a building out of the register; its history stays.
 *
 * Units: none. Valid: the version that was seen. Source: [own].
 */
export const removeBuildingSchema = z.strictObject({ version });

/**
 * The address of a change.
 *
 * Units: none. Valid: a change of the scheme. Source: [own].
 */
export const changeParamsSchema = z.object({ schemeId: z.string(), changeId: z.uuid() });

/**
 * What was done: the change, for undoing it, and the buildings that it left.
 *
 * Units: area m². Valid: version is the scheme's new registerVersion; removed buildings are not among
 * buildingIds; conflicts of an undo are refused whole; overlaps are told where a footprint was drawn:
 * the buildings that it lies over, the largest overlap first. Source: [own].
 */
export const registerChangeSchema = z.strictObject({
  changeId: z.uuid(),
  version: z.number(),
  buildingIds: z.array(z.number()),
  overlaps: z
    .array(z.strictObject({ id: z.number(), reference: z.string(), area: z.number() }))
    .optional(),
});

/**
 * What was done to a register.
 *
 * Units: none. Valid: parsed by registerChangeSchema. Source: [own].
 */
export type RegisterChange = z.infer<typeof registerChangeSchema>;

const changed = z
  .partialRecord(
    z.enum([...BUILDING_FIELD_NAMES, 'reference', 'footprint', 'area', 'groundLevelFrom']),
    z.unknown(),
  )
  .nullable();

/**
 * The history of one building, the newest first. Before and after hold what changed; null before means
 * that it came in, null after that it was taken out; the undoing of an undoing is told as `redo`.
 *
 * Units: as the fields; of a footprint only its area is answered. Valid: at most 200 entries.
 * Source: [own].
 */
export const buildingHistorySchema = z.array(
  z.strictObject({
    changeId: z.uuid(),
    at: z.string(),
    by: z.string().nullable(),
    kind: z.enum([...REGISTER_CHANGE_KINDS, 'redo']),
    source: z.string().nullable(),
    before: changed,
    after: changed,
    mayUndo: z.boolean(),
  }),
);

/**
 * The history of one building.
 *
 * Units: as buildingHistorySchema. Valid: parsed by it. Source: [own].
 */
export type BuildingHistory = z.infer<typeof buildingHistorySchema>;
