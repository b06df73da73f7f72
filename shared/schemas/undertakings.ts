import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { writtenText } from './written.ts';

/**
 * How long what is written of an undertaking may be.
 *
 * Units: letters. Valid: read only. Source: [own].
 */
export const UNDERTAKING_LIMITS = {
  promise: 2000,
  madeTo: 300,
  source: 300,
  responsible: 200,
  evidence: 2000,
} as const;

const chainage = z
  .number('Write a number.')
  .min(0, 'From 0 m on.')
  .max(LIMITS.coordinate, 'That is too far.');

/**
 * What is written of an undertaking: what was promised to whom and where it is written, for a building or a
 * stretch of the line, by when and by whom, and what shows that it is done.
 *
 * Units: chainages m along the drawn line; due and doneOn are days. Valid: a building or a stretch; what is
 * done has evidence; a party is of the scheme. Source: [own].
 */
export const undertakingValuesSchema = z
  .strictObject({
    promise: writtenText(UNDERTAKING_LIMITS.promise).min(1, 'Say what was promised.'),
    madeTo: writtenText(UNDERTAKING_LIMITS.madeTo).min(1, 'Say to whom.'),
    partyId: z.uuid().nullable(),
    source: writtenText(UNDERTAKING_LIMITS.source).min(1, 'Say where it is written.'),
    buildingId: z.number().int().min(1).max(2_147_483_647).nullable(),
    stretch: z
      .strictObject({ from: chainage, to: chainage })
      .refine(({ from, to }) => from <= to, {
        path: ['to'],
        error: 'The end has to be beyond the start.',
      })
      .nullable(),
    due: z.iso.date('Give a day.').nullable(),
    responsible: writtenText(UNDERTAKING_LIMITS.responsible).min(1, 'Say who sees to it.'),
    doneOn: z.iso.date('Give a day.').nullable(),
    evidence: writtenText(UNDERTAKING_LIMITS.evidence),
  })
  .refine(({ buildingId, stretch }) => buildingId !== null || stretch !== null, {
    path: ['buildingId'],
    error: 'Name the building or the stretch of the line.',
  })
  .refine(({ doneOn, evidence }) => doneOn === null || evidence !== '', {
    path: ['evidence'],
    error: 'Say what shows that it is done.',
  });

/**
 * What is written of an undertaking.
 *
 * Units: as undertakingValuesSchema. Valid: parsed by it. Source: [own].
 */
export type UndertakingValues = z.infer<typeof undertakingValuesSchema>;

/**
 * A change of an undertaking, on top of the version that was seen.
 *
 * Units: as undertakingValuesSchema. Valid: an older version is refused. Source: [own].
 */
export const changeUndertakingSchema = z.strictObject({
  version: z.number().int().min(1),
  values: undertakingValuesSchema,
});

/**
 * The address of an undertaking.
 *
 * Units: none. Valid: an undertaking of the scheme. Source: [own].
 */
export const undertakingParamsSchema = z.object({ schemeId: z.string(), undertakingId: z.uuid() });

/**
 * Which undertakings are asked for: all of a scheme, or those for one building.
 *
 * Units: none. Valid: any building's number. Source: [own].
 */
export const undertakingsQuerySchema = z.object({
  building: z.coerce.number().int().min(1).max(2_147_483_647).optional(),
});

/**
 * An undertaking. Who may not read parties is not told the name of one: `madeTo` is null then.
 *
 * Units: as undertakingValuesSchema. Valid: overdue is not done after its day; version grows with every
 * change. Source: [own].
 */
export const undertakingSchema = z.strictObject({
  id: z.uuid(),
  number: z.number(),
  promise: z.string(),
  madeTo: z.string().nullable(),
  partyId: z.uuid().nullable(),
  source: z.string(),
  building: z
    .strictObject({ id: z.number(), reference: z.string(), name: z.string().nullable() })
    .nullable(),
  stretch: z.strictObject({ from: z.number(), to: z.number() }).nullable(),
  due: z.iso.date().nullable(),
  responsible: z.string(),
  doneOn: z.iso.date().nullable(),
  evidence: z.string(),
  isOverdue: z.boolean(),
  version: z.number(),
  createdBy: z.string(),
  changedAt: z.iso.datetime(),
});

/**
 * An undertaking.
 *
 * Units: as undertakingSchema. Valid: parsed by it. Source: [own].
 */
export type Undertaking = z.infer<typeof undertakingSchema>;

/**
 * The undertakings of a scheme: overdue ones first, then by day, done ones last.
 *
 * Units: as undertakingSchema. Valid: at most 2,000. Source: [own].
 */
export const undertakingsSchema = z.array(undertakingSchema);
