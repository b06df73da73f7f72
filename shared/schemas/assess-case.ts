import { z } from 'zod';
import { LIMITS } from './limits.ts';

const coordinate = z.number().min(-LIMITS.coordinate).max(LIMITS.coordinate);
const level = z.number().min(-LIMITS.level).max(LIMITS.level);
const diameter = z.number().positive().max(LIMITS.diameter);
const volumeLossValue = z
  .number()
  .min(0)
  .max(LIMITS.volumeLoss, `must be a fraction up to ${LIMITS.volumeLoss}: 1.5 % is 0.015`);
const troughWidthValue = z.number().positive().max(LIMITS.troughWidth);
const eOverGValue = z.number().positive().max(LIMITS.eOverG);

function ordered(values: readonly number[]): boolean {
  return values.every((value, index) => index === 0 || value >= (values[index - 1] ?? value));
}

function lowCentralHigh(value: z.ZodNumber) {
  const three = z
    .tuple([value, value, value])
    .refine(ordered, 'must be in the order low, central, high');
  return z.union([value, three]);
}

const volumeLoss = lowCentralHigh(volumeLossValue);
const troughWidth = lowCentralHigh(troughWidthValue);

const interval = z
  .strictObject({
    from: z.number(),
    to: z.number(),
    volumeLoss: volumeLoss.optional(),
    troughWidth: troughWidth.optional(),
    diameter: diameter.optional(),
  })
  .refine(({ from, to }) => from < to, { path: ['to'], error: 'must be beyond from' });

const drive = z.strictObject({
  name: z.string().min(1).max(200),
  axis: z
    .array(z.tuple([coordinate, coordinate, level]))
    .min(2)
    .max(LIMITS.axisPoints),
  diameter,
  volumeLoss,
  troughWidth,
  faceChainage: z.number().optional(),
  faceShare: z.number().min(LIMITS.faceShare.least).max(LIMITS.faceShare.most).optional(),
  laterFactor: z.number().min(1).max(LIMITS.laterFactor).optional(),
  intervals: z.array(interval).max(LIMITS.axisPoints).optional(),
});

const wall = z
  .strictObject({
    name: z.string().min(1).max(200),
    from: z.tuple([coordinate, coordinate]),
    to: z.tuple([coordinate, coordinate]),
    foundingLevel: level,
    groundLevel: level.optional(),
    height: z.number().positive().max(LIMITS.height),
    eOverG: z.union([
      eOverGValue,
      z.tuple([eOverGValue, eOverGValue]).refine(ordered, 'must be in the order low, high'),
    ]),
    poisson: z.number().min(0).max(LIMITS.poisson),
  })
  .refine(
    ({ from, to }) =>
      Math.max(Math.abs(to[0] - from[0]), Math.abs(to[1] - from[1])) >= LIMITS.wallLength,
    {
      path: ['to'],
      error: 'is the same point as from, or within a millimetre of it: the wall has no length',
    },
  );

const layers = z
  .array(z.strictObject({ baseLevel: level, troughWidth }))
  .min(1)
  .refine(
    (given) => given.every(({ baseLevel }, k) => baseLevel < (given[k - 1]?.baseLevel ?? Infinity)),
    'must be given from the top down',
  );

const rules = z.strictObject({
  depth: z
    .union([
      z.enum(['clay', 'constant', 'oreilly-new-clay', 'oreilly-new-sand']),
      z.strictObject({ layers }),
    ])
    .optional(),
  focus: z.enum(['axis', 'deep']).optional(),
  cutoff: z
    .union(
      [
        z.number().min(0).max(LIMITS.cutOff),
        z.literal('2.5i'),
        z.strictObject({ widths: z.number().positive().max(10) }),
      ],
      { error: `must be metres from 0 (none) to ${LIMITS.cutOff}, "2.5i" or { "widths": … }` },
    )
    .optional(),
  leadingCategory: z.union([z.literal(1), z.literal(2), z.literal(3), z.literal(4)]).optional(),
  horizontalStrain: z.enum(['average', 'peak']).optional(),
  compression: z.enum(['counted', 'zero']).optional(),
});

/**
 * A case for assessment outside the workbench: ground level, rules, drives and walls.
 *
 * Units: metres, levels above datum, volume losses as fractions. Valid: strict, an unknown key is an
 * error; see LIMITS. Source: [own].
 */
export const assessCaseSchema = z.strictObject({
  groundLevel: level,
  rules: rules.optional(),
  drives: z.array(drive).min(1).max(LIMITS.drives),
  walls: z.array(wall).min(1).max(LIMITS.walls),
});

/**
 * A case that has been checked.
 *
 * Units: as assessCaseSchema. Valid: parsed by it. Source: [own].
 */
export type AssessCase = z.infer<typeof assessCaseSchema>;
