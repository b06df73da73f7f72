import { z } from 'zod';

/**
 * The figures of all buildings of a run that the map is coloured by, one list a figure in one order:
 * numbers of buildings, stage, category at low, central and high (−1 where there is none), and the largest
 * settlement at founding level over the bracket.
 *
 * Units: settlement m. Valid: lists of one length; complete runs only. Source: [own].
 */
export const runMapSchema = z.strictObject({
  ids: z.array(z.number()),
  stage: z.array(z.number()),
  low: z.array(z.number()),
  central: z.array(z.number()),
  high: z.array(z.number()),
  settlement: z.array(z.number()),
});

/**
 * The figures of all buildings of a run that the map is coloured by.
 *
 * Units: as runMapSchema. Valid: parsed by it. Source: [own].
 */
export type RunMap = z.infer<typeof runMapSchema>;

const planPoint = z.tuple([z.number(), z.number()]);

/**
 * The contours of a run: central settlement at the ground, in the scheme's grid.
 *
 * Units: m. Valid: as SettlementContour. Source: [own].
 */
export const runContoursSchema = z.array(
  z.strictObject({ level: z.number(), line: z.array(planPoint), isClosed: z.boolean() }),
);
