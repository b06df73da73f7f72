import { z } from 'zod';
import { LARGEST_SEED } from '../numerics/random-numbers.ts';
import { alignmentDesignSchema } from './alignments.ts';
import { rulesSchema } from './rules.ts';

const planPoint = z.tuple([z.number(), z.number()]);
/**
 * Where a run stands: planned into parts, worked out part by part, complete, or ended before that. A
 * cancelled or failed one keeps what it has and can go on.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const RUN_STATES = ['planning', 'running', 'complete', 'cancelled', 'failed'] as const;

/**
 * Where a run stands.
 *
 * Units: none. Valid: of RUN_STATES. Source: [own].
 */
export type RunStateName = (typeof RUN_STATES)[number];

/**
 * Whether a run is still being planned or worked out.
 *
 * Units: none. Valid: any state. Source: [own].
 */
export function isUnderWay(state: RunStateName): boolean {
  return state === 'planning' || state === 'running';
}

/**
 * What a run is started with: an option of the line at the version that was seen.
 *
 * Units: none. Valid: an older version is refused. Source: [own].
 */
export const newRunSchema = z.strictObject({
  alignmentId: z.uuid(),
  alignmentVersion: z.number().int().min(1),
});

/**
 * The address of a run.
 *
 * Units: none. Valid: a run of the scheme. Source: [own].
 */
export const runParamsSchema = z.object({ schemeId: z.string(), runId: z.uuid() });

/**
 * The address of a building in a run.
 *
 * Units: none. Valid: a building that was in the register when the run was started. Source: [own].
 */
export const runBuildingParamsSchema = z.object({
  schemeId: z.string(),
  runId: z.uuid(),
  buildingId: z.coerce.number().int().min(1).max(2_147_483_647),
});

/**
 * What a sheet is to show beside what was recorded: the samples that a seed draws.
 *
 * Units: none. Valid: a whole number from 0 to LARGEST_SEED, written in figures. Source: [own].
 */
export const sheetQuerySchema = z.object({
  samples: z
    .string()
    .regex(/^\d{1,10}$/, 'Give a whole number as the seed.')
    .transform(Number)
    .pipe(z.number().max(LARGEST_SEED))
    .optional(),
});

/**
 * How far a run is.
 *
 * Units: buildings. Valid: `fault` says why it failed. Source: [own].
 */
export const runProgressSchema = z.strictObject({
  state: z.enum(RUN_STATES),
  done: z.number(),
  buildings: z.number(),
  fault: z.string().nullable(),
});

/**
 * How far a run is.
 *
 * Units: as runProgressSchema. Valid: parsed by it. Source: [own].
 */
export type RunProgress = z.infer<typeof runProgressSchema>;

/**
 * A run as lists and basis lines tell it. `since` says which of its inputs have changed since; an option
 * that was removed has changed.
 *
 * Units: buildings. Valid: `isShown` is the newest complete run of the scheme. Source: [own].
 */
export const runSchema = z.strictObject({
  id: z.uuid(),
  number: z.number(),
  option: z.strictObject({ id: z.uuid(), name: z.string(), version: z.number() }),
  ...runProgressSchema.shape,
  startedAt: z.iso.datetime(),
  startedBy: z.string().nullable(),
  endedAt: z.iso.datetime().nullable(),
  methodVersion: z.string(),
  rulesVersion: z.number(),
  registerVersion: z.number(),
  since: z.strictObject({ register: z.boolean(), option: z.boolean(), rules: z.boolean() }),
  isShown: z.boolean(),
});

/**
 * A run as lists and basis lines tell it.
 *
 * Units: as runSchema. Valid: parsed by it. Source: [own].
 */
export type RunAnswer = z.infer<typeof runSchema>;

/**
 * The newest runs of a scheme, the newest first.
 *
 * Units: as runSchema. Valid: at most 100. Source: [own].
 */
export const runsSchema = z.array(runSchema);

const byCategory = z.tuple([z.number(), z.number(), z.number(), z.number(), z.number()]);

/**
 * How many buildings stand where after a run, by stage and by category at the low, central and high end
 * of the bracket.
 *
 * Units: buildings. Valid: categories 0 to 4; those let go at stage 1 have none; `faults` could not be
 * worked out and stand at stage 3. Source: [own].
 */
export const runCountsSchema = z.strictObject({
  stages: z.tuple([z.number(), z.number(), z.number()]),
  low: byCategory,
  central: byCategory,
  high: byCategory,
  sensitive: z.number(),
  held: z.number(),
  assumed: z.number(),
  faults: z.number(),
});

/**
 * How many buildings stand where after a run.
 *
 * Units: as runCountsSchema. Valid: parsed by it. Source: [own].
 */
export type RunCounts = z.infer<typeof runCountsSchema>;

/**
 * A run with everything that was put in, and how many buildings stand where once it is complete.
 *
 * Units: as the parts. Valid: never changes but for its progress. Source: [own].
 */
export const runDetailSchema = runSchema.extend({
  design: alignmentDesignSchema,
  rules: rulesSchema,
  counts: runCountsSchema.nullable(),
});

/**
 * A run with everything that was put in.
 *
 * Units: as runDetailSchema. Valid: parsed by it. Source: [own].
 */
export type RunDetail = z.infer<typeof runDetailSchema>;

const category = z.union([z.literal(0), z.literal(1), z.literal(2), z.literal(3), z.literal(4)]);

/**
 * What a run found of a building, as it is recorded. Figures of the strain stage are null where screening
 * let the building go.
 *
 * Units: settlements m; slopes, strains and deflection ratios m/m; breakpoint a factor on the central
 * volume losses, breakpointVolumeLoss m/m; reserves are shares of the volume losses; chainage and offset m
 * of the footprint's middle beside the drawn line. Valid: settlement and slope are the largest over
 * the bracket at founding level, wallSettlement and wallSlope the central ones along its walls.
 * Source: mair-taylor-burland-1996.
 */
export const runResultSchema = z.strictObject({
  stage: z.union([z.literal(1), z.literal(2), z.literal(3)]),
  settlement: z.number(),
  slope: z.number(),
  strainLow: z.number().nullable(),
  strain: z.number().nullable(),
  strainHigh: z.number().nullable(),
  categoryLow: category.nullable(),
  category: category.nullable(),
  categoryHigh: category.nullable(),
  rankin: z.string().nullable(),
  wallSettlement: z.number().nullable(),
  wallSlope: z.number().nullable(),
  breakpoint: z.number().nullable(),
  breakpointVolumeLoss: z.number().nullable(),
  reserve: z.number().nullable(),
  reserveOverHigh: z.number().nullable(),
  isSettled: z.boolean().nullable(),
  sensitiveTo: z.string().nullable(),
  governingWall: z.string().nullable(),
  isRow: z.boolean().nullable(),
  mode: z.string().nullable(),
  deflectionRatio: z.number().nullable(),
  horizontalStrain: z.number().nullable(),
  heldBy: z.array(z.string()),
  assumed: z.array(z.string()),
  warnings: z.array(z.string()),
  fault: z.string().nullable(),
  chainage: z.number().nullable(),
  offset: z.number().nullable(),
});

/**
 * What a run found of a building, as it is recorded.
 *
 * Units: as runResultSchema. Valid: parsed by it. Source: mair-taylor-burland-1996.
 */
export type RunResult = z.infer<typeof runResultSchema>;

/**
 * A building as a run took it: what the register knew of it then.
 *
 * Units: m, levels above datum. Valid: null is unknown; parts in the scheme's grid. Source: [own].
 */
export const runFactsSchema = z.strictObject({
  id: z.string(),
  reference: z.string(),
  name: z.string().nullable(),
  address: z.string().nullable(),
  use: z.string().nullable(),
  parts: z.array(z.array(z.array(planPoint))),
  storeys: z.number().nullable(),
  eavesHeight: z.number().nullable(),
  groundLevel: z.number().nullable(),
  foundingLevel: z.number().nullable(),
  foundation: z.string().nullable(),
  construction: z.string().nullable(),
  eOverG: z.number().nullable(),
  poisson: z.number().nullable(),
  listedGrade: z.string().nullable(),
  condition: z.string().nullable(),
  inspected: z.string().nullable(),
  structureScore: z.number().nullable().default(null),
  structureReason: z.string().nullable().default(null),
  featuresScore: z.number().nullable().default(null),
  featuresReason: z.string().nullable().default(null),
});

/**
 * A building as a run took it.
 *
 * Units: as runFactsSchema. Valid: parsed by it. Source: [own].
 */
export type RunFacts = z.infer<typeof runFactsSchema>;

/**
 * One building in a run: what was put in, what was recorded, and the rows that its walls stand in, so that
 * everything can be worked out again with the run's design and rules.
 *
 * Units: m. Valid: `changedSince` tells whether the register holds another version by now; `rows` are the
 * joined walls by index of the building's own walls; `previous` and `next` are the numbers of the buildings
 * of the run beside it by reference, null at either end. Source: [own].
 */
export const runBuildingSchema = z.strictObject({
  facts: runFactsSchema,
  version: z.number(),
  changedSince: z.boolean(),
  rows: z.array(
    z.strictObject({
      wallIndex: z.number(),
      segment: z.strictObject({ start: planPoint, end: planPoint }),
    }),
  ),
  result: runResultSchema,
  previous: z.number().nullable(),
  next: z.number().nullable(),
});

/**
 * One building in a run.
 *
 * Units: as runBuildingSchema. Valid: parsed by it. Source: [own].
 */
export type RunBuilding = z.infer<typeof runBuildingSchema>;
