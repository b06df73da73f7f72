import { z } from 'zod';
import { DECISION_KINDS, DECISION_STATES, STANDINGS } from './decisions.ts';

const category = z.union([z.literal(0), z.literal(1), z.literal(2), z.literal(3), z.literal(4)]);
const person = z.strictObject({ id: z.uuid(), name: z.string() });

/**
 * What a decision rests on, as whoever prepared it saw it.
 *
 * Units: settlement m, slope and strain m/m. Valid: as Conclusion, with the figures that lead to it.
 * Source: [own].
 */
export const decisionBasisSchema = z.strictObject({
  stage: z.union([z.literal(1), z.literal(2), z.literal(3)]).nullable(),
  categoryLow: category.nullable(),
  category: category.nullable(),
  categoryHigh: category.nullable(),
  isSettled: z.boolean().nullable(),
  heldBy: z.array(z.string()),
  sensitivityTotal: z.number().nullable(),
  isWorkedOut: z.boolean(),
  settlement: z.number(),
  slope: z.number(),
  strain: z.number().nullable(),
  breakpoint: z.number().nullable(),
  reserve: z.number().nullable(),
  assumed: z.array(z.string()),
});

/**
 * What a decision rests on.
 *
 * Units: as decisionBasisSchema. Valid: parsed by it. Source: [own].
 */
export type DecisionBasis = z.infer<typeof decisionBasisSchema>;

/**
 * One decision on a building, with what it rests on and what of that has changed since.
 *
 * Units: as decisionBasisSchema. Valid: never changes but for its state; abilities are the server's
 * answers, `mayNotCheck` says why where the caller may check others. Source: [own].
 */
export const decisionSchema = z.strictObject({
  id: z.uuid(),
  buildingId: z.number(),
  run: z.strictObject({ id: z.uuid(), number: z.number(), option: z.string() }),
  rulesVersion: z.number(),
  buildingVersion: z.number(),
  kind: z.enum(DECISION_KINDS),
  category: category.nullable(),
  reason: z.string(),
  basis: decisionBasisSchema,
  batch: z.strictObject({ id: z.uuid(), size: z.number() }),
  preparedBy: person,
  preparedAt: z.iso.datetime(),
  state: z.enum(DECISION_STATES),
  checkedBy: person.nullable(),
  checkedAt: z.iso.datetime().nullable(),
  comment: z.string().nullable(),
  changes: z.array(
    z.strictObject({
      what: z.enum(['stage', 'category', 'settled', 'held', 'sensitivity', 'fault', 'run']),
      was: z.string().nullable(),
      is: z.string().nullable(),
    }),
  ),
  changedBy: z
    .strictObject({ run: z.number(), rulesVersion: z.number(), at: z.iso.datetime() })
    .nullable(),
  abilities: z.strictObject({ check: z.boolean(), withdraw: z.boolean() }),
  mayNotCheck: z.string().nullable(),
});

/**
 * One decision on a building.
 *
 * Units: as decisionSchema. Valid: parsed by it. Source: [own].
 */
export type Decision = z.infer<typeof decisionSchema>;

/**
 * The decisions on a building for the option of a run, the newest first, with what can be decided of it
 * now.
 *
 * Units: none. Valid: `open` names each kind of decision with the reason why it cannot be had, null where it
 * can; `conclusion` is what figures, register and rules come to now. Source: [own].
 */
export const buildingDecisionsSchema = z.strictObject({
  decisions: z.array(decisionSchema),
  open: z.array(z.strictObject({ kind: z.enum(DECISION_KINDS), why: z.string().nullable() })),
  conclusion: decisionBasisSchema,
  version: z.number(),
  assignedTo: person.nullable(),
});

/**
 * The decisions on a building.
 *
 * Units: as buildingDecisionsSchema. Valid: parsed by it. Source: [own].
 */
export type BuildingDecisions = z.infer<typeof buildingDecisionsSchema>;

/**
 * Those who can be given buildings: the assessors of a scheme, by name.
 *
 * Units: none. Valid: people who may sign in. Source: [own].
 */
export const assessorsSchema = z.array(person);

const standingCounts = z.strictObject({
  buildings: z.number(),
  standings: z.record(z.enum(STANDINGS), z.number()),
});

/**
 * How many buildings of the run that is shown stand at each stage and in each state, which rules hold how
 * many, and what is decided.
 *
 * Units: counts of buildings. Valid: stages 1, 2, 3; `texts` are what the register writes where a rule holds,
 * alone and beside others; decided kinds are of those in force. Source: [own].
 */
export const funnelSchema = z.strictObject({
  runId: z.uuid().nullable(),
  buildings: z.number(),
  stages: z.tuple([standingCounts, standingCounts, standingCounts]),
  heldBy: z.array(
    z.strictObject({ name: z.string(), count: z.number(), texts: z.array(z.string()) }),
  ),
  kinds: z.array(z.strictObject({ kind: z.enum(DECISION_KINDS), count: z.number() })),
  mine: z.number(),
});

/**
 * How many buildings stand where.
 *
 * Units: as funnelSchema. Valid: parsed by it. Source: [own].
 */
export type Funnel = z.infer<typeof funnelSchema>;
