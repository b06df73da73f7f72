import { z } from 'zod';
import { registerFilterSchema } from './register.ts';
import { writtenText } from './written.ts';

/**
 * What can be decided of a building.
 *
 * Units: none. Valid: closed list. Source: [own]; letting go by stages is mair-taylor-burland-1996.
 */
export const DECISION_KINDS = [
  'let go at stage 1',
  'let go at stage 2',
  'go to stage 3',
  'adopt a category',
  'protective measures',
  'no measures',
] as const;

/**
 * What is decided of a building.
 *
 * Units: none. Valid: of DECISION_KINDS. Source: [own].
 */
export type DecisionKind = (typeof DECISION_KINDS)[number];

/**
 * Where a decision stands. Only one that waits can move on, and one that is in force can be superseded.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const DECISION_STATES = [
  'waiting for check',
  'returned',
  'withdrawn',
  'checked',
  'superseded',
] as const;

/**
 * Where a building stands on the assessors' list.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const STANDINGS = [
  'to decide',
  'waiting for check',
  'returned',
  'to look at again',
  'decided',
] as const;

/**
 * Where a building stands on the assessors' list.
 *
 * Units: none. Valid: of STANDINGS. Source: [own].
 */
export type Standing = (typeof STANDINGS)[number];

/**
 * How long a reason or a comment may be.
 *
 * Units: letters. Valid: read only. Source: [own].
 */
export const DECISION_TEXT = 2000;

const words = writtenText(DECISION_TEXT);
const category = z.union([z.literal(0), z.literal(1), z.literal(2), z.literal(3), z.literal(4)]);
const expected = z.number().int().min(1);

function namesCategory(given: { kind: DecisionKind; category?: number | undefined }): boolean {
  return (given.kind === 'adopt a category') === (given.category !== undefined);
}

const NO_CATEGORY = { path: ['category'], error: 'Say which category is adopted.' };

/**
 * What is to be decided of the buildings that a filter means, on a run.
 *
 * Units: none. Valid: a category goes with adopting one, which gives a reason; `version` is that of a
 * single building as it was seen. Source: [own].
 */
export const proposedDecisionSchema = z
  .strictObject({
    runId: z.uuid(),
    filter: registerFilterSchema,
    kind: z.enum(DECISION_KINDS),
    category: category.optional(),
    reason: words.default(''),
    version: z.number().int().min(1).optional(),
  })
  .refine(namesCategory, NO_CATEGORY);

/**
 * Prepares a decision of many buildings or of one. `expected` is how many can have it by the preview.
 *
 * Units: none. Valid: refused where another number can have it now. Source: [own].
 */
export const newDecisionsSchema = z
  .strictObject({ ...proposedDecisionSchema.shape, expected })
  .refine(namesCategory, NO_CATEGORY);

/**
 * What a decision of the buildings that are meant would come to, to be looked at before it is prepared.
 *
 * Units: settlement m, slope m/m, the largest of those that can have it; counts of buildings. Valid:
 * `refused` says why the others cannot; categories 0 to 4 are central ones, of those at stage 2 or 3.
 * Source: [own].
 */
export const decisionPreviewSchema = z.strictObject({
  meant: z.number(),
  allowed: z.number(),
  refused: z.array(z.strictObject({ why: z.string(), count: z.number() })),
  settlement: z.number().nullable(),
  slope: z.number().nullable(),
  categories: z.tuple([z.number(), z.number(), z.number(), z.number(), z.number()]),
  sensitive: z.number(),
  assumed: z.number(),
  listed: z.number(),
});

/**
 * What a decision would come to.
 *
 * Units: as decisionPreviewSchema. Valid: parsed by it. Source: [own].
 */
export type DecisionPreview = z.infer<typeof decisionPreviewSchema>;

const verdict = z.enum(['checked', 'returned']);

function isCommented(given: { verdict: 'checked' | 'returned'; comment: string }): boolean {
  return given.verdict === 'checked' || given.comment !== '';
}

/**
 * A check of every decision that waits on the buildings that a filter means and that somebody else
 * prepared.
 *
 * Units: none. Valid: returning says why; refused where another number waits now. Source: [own].
 */
export const checkDecisionsSchema = z
  .strictObject({ filter: registerFilterSchema, verdict, comment: words.default(''), expected })
  .refine(isCommented, { path: ['comment'], error: 'Say why it is returned.' });

/**
 * Takes back what the caller prepared and nobody has checked yet, on the buildings that a filter means.
 *
 * Units: none. Valid: refused where another number of the caller's waits now. Source: [own].
 */
export const withdrawDecisionsSchema = z.strictObject({ filter: registerFilterSchema, expected });

/**
 * Asks what a check would be of.
 *
 * Units: none. Valid: any filter. Source: [own].
 */
export const waitingDecisionsSchema = z.strictObject({ filter: registerFilterSchema });

/**
 * What waits for a check on the buildings that are meant: how many the caller may check, by kind, and how
 * many the caller prepared, which somebody else checks.
 *
 * Units: counts of decisions. Valid: `changed` wait on a basis that has changed, and cannot be checked.
 * Source: [own].
 */
export const waitingDecisionsAnswerSchema = z.strictObject({
  kinds: z.array(z.strictObject({ kind: z.enum(DECISION_KINDS), count: z.number() })),
  may: z.number(),
  own: z.number(),
  changed: z.number(),
});

/**
 * What waits for a check.
 *
 * Units: as waitingDecisionsAnswerSchema. Valid: parsed by it. Source: [own].
 */
export type WaitingDecisions = z.infer<typeof waitingDecisionsAnswerSchema>;

/**
 * A check of one decision.
 *
 * Units: none. Valid: returning says why. Source: [own].
 */
export const checkDecisionSchema = z
  .strictObject({ verdict, comment: words.default('') })
  .refine(isCommented, { path: ['comment'], error: 'Say why it is returned.' });

/**
 * The address of a decision.
 *
 * Units: none. Valid: a decision of the scheme. Source: [own].
 */
export const decisionParamsSchema = z.object({ schemeId: z.string(), decisionId: z.uuid() });

/**
 * How many decisions were made or moved, and the batch that they are called by.
 *
 * Units: counts of decisions. Valid: at least one. Source: [own].
 */
export const decisionsDoneSchema = z.strictObject({
  batchId: z.uuid().nullable(),
  count: z.number(),
});

/**
 * Gives buildings to an assessor, or to nobody.
 *
 * Units: none. Valid: somebody who is assessor of the scheme. Source: [own].
 */
export const assignBuildingsSchema = z.strictObject({
  filter: registerFilterSchema,
  expected,
  personId: z.uuid().nullable(),
});
