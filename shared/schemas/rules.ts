import { z } from 'zod';
import { DEFAULT_SENSITIVITY } from '../damage/sensitivity-score.ts';
import { REFERENCES, type ReferenceKey } from '../references.ts';
import { LIMITS } from './limits.ts';

/**
 * How many rules of a kind a scheme may have, and how long their names may be.
 *
 * Units: pieces, characters. Valid: read only. Source: [own].
 */
export const RULE_LIMITS = { holds: 50, layers: 50, reasons: 30, name: 200 } as const;

/** The day from which the default reasons hold in rules that were kept before there were any. */
const REASONS_FROM = '2026-12-01';

const source = z.custom<ReferenceKey>(
  (value) => typeof value === 'string' && Object.hasOwn(REFERENCES, value),
  'Choose one of the works that the method cites.',
);
const date = z.iso.date();

/** A rule with where it comes from and the day from which it holds. */
function ruled<T extends z.ZodType>(value: T) {
  return z.strictObject({ value, source, date });
}

const troughWidth = z.number().positive().max(LIMITS.troughWidth);
const troughWidthRange = z
  .strictObject({ low: troughWidth, central: troughWidth, high: troughWidth })
  .refine(({ low, central, high }) => low <= central && central <= high, {
    error: 'Keep to the order low, central, high.',
  });

const layers = z
  .array(
    z.strictObject({
      baseLevel: z.number().min(-LIMITS.level).max(LIMITS.level),
      troughWidth: troughWidthRange,
    }),
  )
  .min(1)
  .max(RULE_LIMITS.layers)
  .refine(
    (given) => given.every((layer, k) => layer.baseLevel < (given[k - 1]?.baseLevel ?? Infinity)),
    'Give layers from the top down.',
  )
  .readonly();

const depth = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.enum(['constant', 'clay', 'oreilly-new-clay', 'oreilly-new-sand']) }),
  z.strictObject({ kind: z.literal('layered'), layers }),
]);

const cutOff = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('settlement'),
    settlement: z.number().min(0).max(LIMITS.cutOff),
  }),
  z.strictObject({ kind: z.literal('widths'), widths: z.number().positive().max(10) }),
]);

const condition = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('founded deeper than'),
    depth: z.number().positive().max(LIMITS.level),
  }),
  z.strictObject({ kind: z.enum(['piled', 'inside zone of works', 'listed', 'poor condition']) }),
  z.strictObject({
    kind: z.literal('sensitivity total from'),
    total: z.number().int().min(1).max(100),
  }),
]);

function nameOf(missing: string, broken: string) {
  return z
    .string()
    .trim()
    .min(1, missing)
    .max(RULE_LIMITS.name)
    .regex(/^\P{Cc}*$/u, broken);
}

const hold = z.strictObject({
  name: nameOf('Give it a name.', 'Write the name on one line.'),
  condition,
  stages: z
    .array(z.union([z.literal(1), z.literal(2)]))
    .min(1, 'Choose at least one stage.')
    .refine((stages) => new Set(stages).size === stages.length, 'Name each stage once.')
    .readonly(),
  source,
  date,
});

const reasons = z
  .array(
    z.strictObject({
      score: z.union([z.literal(0), z.literal(1), z.literal(2)]),
      reason: nameOf('Give the reason.', 'Write the reason on one line.'),
    }),
  )
  .max(RULE_LIMITS.reasons, `At most ${RULE_LIMITS.reasons} reasons.`)
  .refine(
    (given) => new Set(given.map(({ reason }) => reason)).size === given.length,
    'Give each reason once.',
  )
  .readonly();

const sensitivity = ruled(z.strictObject({ structure: reasons, features: reasons }));

const leadingCategory = z
  .union([z.literal(0), z.literal(1), z.literal(2), z.literal(3), z.literal(4)])
  .refine((category) => category > 0, 'Every building reaches category 0: choose a higher one.');

const limits = z.strictObject({
  settlement: z.number().positive().max(LIMITS.cutOff),
  slope: z.number().positive().max(1),
});

/**
 * The rules and limits of a scheme, each with its source and the day from which it holds. It mirrors
 * AssessmentRules, ScreeningLimits and Hold of the method. The reasons of sensitivity are offered to who
 * scores a building; rules that were kept without them have the default ones.
 *
 * Units: lengths m, slope m/m, K, scores and total without unit. Valid: strict; settlement of cutOff 0
 * means nothing is ignored; holds by different names; a reason once in its kind. Source: [own] for the shape; each rule names its own.
 */
export const rulesSchema = z.strictObject({
  screening: ruled(limits),
  holds: z
    .array(hold)
    .max(RULE_LIMITS.holds)
    .refine(
      (holds) => new Set(holds.map(({ name }) => name)).size === holds.length,
      'Give each hold a name of its own.',
    )
    .readonly(),
  depth: ruled(depth),
  focus: ruled(z.enum(['axis', 'deep'])),
  cutOff: ruled(cutOff),
  horizontalStrain: ruled(z.enum(['average', 'peak'])),
  compression: ruled(z.enum(['counted', 'zero'])),
  leadingCategory: ruled(leadingCategory),
  sensitivity: sensitivity.default({
    value: DEFAULT_SENSITIVITY,
    source: 'common-practice',
    date: REASONS_FROM,
  }),
});

/**
 * New rules for a scheme; `basedOn` is the version they were made from.
 *
 * Units: as rulesSchema. Valid: a version that is not the newest is refused. Source: [own].
 */
export const newRulesSchema = z.strictObject({
  basedOn: z.number().int().positive(),
  rules: rulesSchema,
});

/**
 * One version of a scheme's rules: never changed, only followed by the next.
 *
 * Units: as rulesSchema. Valid: versions from 1 up. Source: [own].
 */
export const rulesVersionSchema = z.strictObject({
  version: z.number(),
  rules: rulesSchema,
  createdAt: z.iso.datetime(),
  createdBy: z.strictObject({ id: z.uuid(), name: z.string() }),
});

/**
 * Every version of a scheme's rules, the newest first.
 *
 * Units: as rulesSchema. Valid: at least one. Source: [own].
 */
export const rulesVersionsSchema = z.array(rulesVersionSchema);

/**
 * The rules and limits of a scheme.
 *
 * Units: as rulesSchema. Valid: parsed by it. Source: [own] for the shape; each rule names its own.
 */
export type RuleSet = z.infer<typeof rulesSchema>;

/**
 * One version of a scheme's rules.
 *
 * Units: as rulesVersionSchema. Valid: parsed by it. Source: [own].
 */
export type RulesVersion = z.infer<typeof rulesVersionSchema>;
