import { z } from 'zod';
import { buildingAttributesSchema } from './building-fields.ts';
import { writtenLine, writtenText } from './written.ts';

/**
 * Where somebody was who visited a building.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const VISIT_PARTS = ['inside', 'outside', 'inside and outside'] as const;

/**
 * Words that the list of kinds of defect offers; another one is written into the note.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const DEFECT_KINDS = [
  'crack',
  'bulge',
  'lean',
  'damp',
  'spalling',
  'distortion of an opening',
  'earlier repair',
  'other',
] as const;

/**
 * The most that a visit holds.
 *
 * Units: letters for texts, mm for width, bytes for photographBytes, pixels for pixels. Valid: read only.
 * Source: [own].
 */
export const VISIT_LIMITS = {
  photographs: 60,
  photographBytes: 15 * 1024 * 1024,
  pixels: 100_000,
  defects: 100,
  width: 1000,
  words: 300,
  place: 200,
  note: 500,
  caption: 300,
  notes: 5000,
} as const;

/**
 * What a photograph's file may be.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const PHOTOGRAPH_TYPES = ['image/jpeg', 'image/png', 'image/webp'] as const;

/**
 * What a photograph's file may be.
 *
 * Units: none. Valid: of PHOTOGRAPH_TYPES. Source: [own].
 */
export type PhotographType = (typeof PHOTOGRAPH_TYPES)[number];

/**
 * What of the register a visit may put right.
 *
 * Units: as BUILDING_FIELDS. Valid: read only. Source: [own].
 */
export const VISITED_FIELDS = [
  'condition',
  'construction',
  'use',
  'storeys',
  'eavesHeight',
  'groundLevel',
  'foundingLevel',
  'foundation',
  'listedGrade',
] as const;

/**
 * A field of the register that a visit may put right.
 *
 * Units: none. Valid: of VISITED_FIELDS. Source: [own].
 */
export type VisitedField = (typeof VISITED_FIELDS)[number];

const words = writtenLine(VISIT_LIMITS.words).min(1).nullable();

/**
 * Something that is not as it should be: where, of what kind, how wide.
 *
 * Units: width mm. Valid: null is not measured. Source: [own].
 */
export const defectSchema = z.strictObject({
  place: writtenLine(VISIT_LIMITS.place).min(1, 'Say where it is.'),
  kind: z.enum(DEFECT_KINDS),
  width: z
    .number('Write a number.')
    .min(0, `From 0 to ${VISIT_LIMITS.width} mm.`)
    .max(VISIT_LIMITS.width, `From 0 to ${VISIT_LIMITS.width} mm.`)
    .nullable(),
  note: writtenLine(VISIT_LIMITS.note),
});

/**
 * Something that is not as it should be.
 *
 * Units: as defectSchema. Valid: parsed by it. Source: [own].
 */
export type Defect = z.infer<typeof defectSchema>;

const pixels = z.number().int().min(1).max(VISIT_LIMITS.pixels).nullable();
const position = z.tuple([z.number().min(-180).max(180), z.number().min(-90).max(90)]);

const photographShape = {
  id: z.uuid(),
  caption: writtenLine(VISIT_LIMITS.caption),
  takenAt: z.iso.datetime({ offset: true }).nullable(),
  width: pixels,
  height: pixels,
  keepsPlace: z.boolean(),
  place: position.nullable(),
};

const announcedSchema = z
  .strictObject(photographShape)
  .refine(({ keepsPlace, place }) => keepsPlace || place === null, {
    path: ['place'],
    error: 'Where it was taken is kept only where somebody said so.',
  });

/**
 * What a visit puts right in the register, on top of the version of the building that was seen.
 *
 * Units: as BUILDING_FIELDS. Valid: some of VISITED_FIELDS; a version that is not the newest is refused.
 * Source: [own].
 */
const correctionsSchema = z.strictObject({
  version: z.number().int().min(1),
  values: buildingAttributesSchema.refine(
    (values) => Object.keys(values).length > 0 && Object.keys(values).every(isVisited),
    'A visit cannot change this.',
  ),
});

function isVisited(name: string): boolean {
  return VISITED_FIELDS.some((field) => field === name);
}

/**
 * A visit as the phone records it, numbered by the phone so that sending it twice records it once. Its
 * photographs are announced here and follow one by one.
 *
 * Units: visitedAt with the offset of where the building stands; place longitude and latitude in degrees.
 * Valid: as VISIT_LIMITS; a place only where it is to be kept. Source: [own].
 */
export const newVisitSchema = z.strictObject({
  id: z.uuid(),
  visitedAt: z.iso.datetime({ offset: true }),
  part: z.enum(VISIT_PARTS),
  condition: words,
  construction: words,
  notes: writtenText(VISIT_LIMITS.notes),
  defects: z.array(defectSchema).max(VISIT_LIMITS.defects),
  photographs: z
    .array(announcedSchema)
    .max(VISIT_LIMITS.photographs, `At most ${VISIT_LIMITS.photographs} photographs.`)
    .refine((all) => new Set(all.map(({ id }) => id)).size === all.length, 'One is there twice.'),
  changes: correctionsSchema.nullable(),
});

/**
 * A visit as the phone records it.
 *
 * Units: as newVisitSchema. Valid: parsed by it. Source: [own].
 */
export type NewVisit = z.infer<typeof newVisitSchema>;

/**
 * The address of a photograph of a visit.
 *
 * Units: none. Valid: a photograph that the visit announced. Source: [own].
 */
export const photographParamsSchema = z.object({
  schemeId: z.string(),
  visitId: z.uuid(),
  photographId: z.uuid(),
});

/**
 * The file of a photograph as it was taken in.
 *
 * Units: bytes. Valid: told by what the file holds. Source: [own].
 */
export const photographFileSchema = z.strictObject({
  id: z.uuid(),
  type: z.enum(PHOTOGRAPH_TYPES),
  bytes: z.number(),
});

/**
 * A visit as it is recorded. It never changes; what was wrong is put right by another visit.
 *
 * Units: as newVisitSchema. Valid: `hasArrived` tells whether the photograph's file is there.
 * Source: [own].
 */
export const visitSchema = z.strictObject({
  id: z.uuid(),
  buildingId: z.number(),
  visitedAt: z.iso.datetime(),
  recordedAt: z.iso.datetime(),
  by: z.string(),
  part: z.enum(VISIT_PARTS),
  condition: z.string().nullable(),
  construction: z.string().nullable(),
  notes: z.string(),
  defects: z.array(defectSchema),
  photographs: z.array(
    z.strictObject({ ...photographShape, takenAt: z.string().nullable(), hasArrived: z.boolean() }),
  ),
});

/**
 * A visit as it is recorded.
 *
 * Units: as visitSchema. Valid: parsed by it. Source: [own].
 */
export type VisitAnswer = z.infer<typeof visitSchema>;

/**
 * The visits of one building, the newest first.
 *
 * Units: as visitSchema. Valid: at most 200. Source: [own].
 */
export const visitsSchema = z.array(visitSchema);

/**
 * Which buildings of a scheme have been visited: how often, and when, by whom and where the last time, the
 * newest first.
 *
 * Units: none. Valid: at most 2,000 buildings. Source: [own].
 */
export const visitedBuildingsSchema = z.array(
  z.strictObject({
    buildingId: z.number(),
    reference: z.string(),
    name: z.string().nullable(),
    address: z.string().nullable(),
    visits: z.number(),
    visitedAt: z.iso.datetime(),
    by: z.string(),
    part: z.enum(VISIT_PARTS),
  }),
);

/**
 * A building that has been visited.
 *
 * Units: as visitedBuildingsSchema. Valid: parsed by it. Source: [own].
 */
export type VisitedBuilding = z.infer<typeof visitedBuildingsSchema>[number];
