import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { chainageSchema, coordinateSchema } from './places.ts';
import { writtenLine } from './written.ts';

/**
 * How long an alignment and its lists may be.
 *
 * Units: pieces, letters. Valid: read only. Source: [own].
 */
export const ALIGNMENT_LIMITS = {
  points: 5000,
  intervals: 200,
  levels: 500,
  shafts: 100,
  name: 80,
  source: 200,
} as const;

const level = z.number('Write a number.').min(-LIMITS.level).max(LIMITS.level);
const volumeLoss = z.number('Write a number.').min(0).max(LIMITS.volumeLoss, 'At most 20 %.');
const troughWidth = z.number('Write a number.').positive().max(LIMITS.troughWidth);

function range(value: z.ZodNumber) {
  return z
    .strictObject({ low: value, central: value, high: value })
    .refine(({ low, central, high }) => low <= central && central <= high, {
      error: 'Keep to the order low, central, high.',
    });
}

const interval = z
  .strictObject({
    from: chainageSchema,
    to: chainageSchema,
    volumeLoss: range(volumeLoss),
    troughWidth: range(troughWidth),
  })
  .refine(({ from, to }) => from < to, {
    path: ['to'],
    error: 'The end has to be beyond the start.',
  });

/**
 * What a designer draws: the line in plan, levels of the axis along it, one bore or two, and the ground
 * losses with their ranges.
 *
 * Units: m, levels above datum, volume losses as fractions, K without unit; chainage is plan length from
 * the first point. Valid: points differ by a millimetre or more; levels in order of chainage, straight
 * between them and level beyond them; intervals do not overlap, elsewhere the whole line's values hold;
 * `spacing` is between the axes of twin bores and at least the diameter, `later` the one driven second with its volume loss times
 * `laterFactor`; backward drives run from the last point to the first. Source: [own].
 */
export const alignmentDesignSchema = z
  .strictObject({
    line: z
      .array(z.tuple([coordinateSchema, coordinateSchema]))
      .min(2, 'Draw two points at least.')
      .max(ALIGNMENT_LIMITS.points),
    levels: z
      .array(z.strictObject({ chainage: chainageSchema, level }))
      .min(1, 'Give the level of the axis at one chainage at least.')
      .max(ALIGNMENT_LIMITS.levels)
      .refine(
        (given) => given.every(({ chainage: at }, k) => at > (given[k - 1]?.chainage ?? -1)),
        'Give levels in the order of their chainage.',
      ),
    diameter: z.number('Write a number.').positive().max(LIMITS.diameter),
    bores: z.discriminatedUnion('kind', [
      z.strictObject({ kind: z.literal('single') }),
      z.strictObject({
        kind: z.literal('twin'),
        spacing: z.number('Write a number.').positive().max(500),
        later: z.enum(['left', 'right']),
        laterFactor: z.number('Write a number.').min(1).max(LIMITS.laterFactor),
      }),
    ]),
    direction: z.enum(['forward', 'backward']),
    groundLevel: level,
    volumeLoss: range(volumeLoss),
    troughWidth: range(troughWidth),
    intervals: z
      .array(interval)
      .max(ALIGNMENT_LIMITS.intervals)
      .refine(
        (given) => given.every(({ from }, k) => from >= (given[k - 1]?.to ?? 0)),
        'Give intervals in order, without overlap.',
      ),
  })
  .refine(({ bores, diameter }) => bores.kind === 'single' || bores.spacing >= diameter, {
    path: ['bores', 'spacing'],
    error: 'Leave at least the diameter between the axes of two bores.',
  });

/**
 * A designed alignment.
 *
 * Units: as alignmentDesignSchema. Valid: parsed by it. Source: [own].
 */
export type AlignmentDesign = z.infer<typeof alignmentDesignSchema>;

/**
 * The shafts of an option: named places beside what is driven, each with where it comes from. No run takes
 * them; rules of letters do.
 *
 * Units: m in the scheme's grid, at the middle of the shaft. Valid: names that differ. Source: [own].
 */
export const shaftsSchema = z
  .array(
    z.strictObject({
      name: writtenLine(ALIGNMENT_LIMITS.name).min(1, 'Name the shaft.'),
      east: coordinateSchema,
      north: coordinateSchema,
      source: writtenLine(ALIGNMENT_LIMITS.source).min(1, 'Say where this comes from.'),
    }),
  )
  .max(ALIGNMENT_LIMITS.shafts)
  .refine(
    (given) => new Set(given.map((one) => one.name)).size === given.length,
    'Give each shaft a name of its own.',
  );

/**
 * The shafts of an option.
 *
 * Units: as shaftsSchema. Valid: parsed by it. Source: [own].
 */
export type Shafts = z.infer<typeof shaftsSchema>;

const name = z
  .string()
  .trim()
  .min(1, 'Give the option a name.')
  .max(ALIGNMENT_LIMITS.name)
  .regex(/^\P{Cc}*$/u);

/**
 * A new option for the line of a scheme.
 *
 * Units: as alignmentDesignSchema. Valid: a name that no other option of the scheme has. Source: [own].
 */
export const newAlignmentSchema = z.strictObject({
  name,
  design: alignmentDesignSchema,
  shafts: shaftsSchema.default([]),
});

/**
 * A change of an option, on top of the version that was seen.
 *
 * Units: as alignmentDesignSchema. Valid: an older version is refused, and what changed is told.
 * Source: [own].
 */
export const changeAlignmentSchema = z.strictObject({
  version: z.number().int().min(1),
  name: name.optional(),
  design: alignmentDesignSchema.optional(),
  shafts: shaftsSchema.optional(),
});

/**
 * A copy of an option under another name.
 *
 * Units: none. Valid: a name that no other option of the scheme has. Source: [own].
 */
export const copyAlignmentSchema = z.strictObject({ name });

/**
 * The address of an option.
 *
 * Units: none. Valid: an option of the scheme. Source: [own].
 */
export const alignmentParamsSchema = z.object({ schemeId: z.string(), alignmentId: z.uuid() });

/**
 * An option for the line of a scheme, with its plan length.
 *
 * Units: as alignmentDesignSchema; length m. Valid: version grows with every change. Source: [own].
 */
export const alignmentSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  version: z.number(),
  design: alignmentDesignSchema,
  shafts: shaftsSchema,
  length: z.number(),
  changedAt: z.string(),
  changedBy: z.string().nullable(),
});

/**
 * The options of a scheme by name.
 *
 * Units: as alignmentSchema. Valid: at most a few dozen. Source: [own].
 */
export const alignmentsSchema = z.array(alignmentSchema);

/**
 * An option for the line of a scheme.
 *
 * Units: as alignmentSchema. Valid: parsed by it. Source: [own].
 */
export type AlignmentAnswer = z.infer<typeof alignmentSchema>;
