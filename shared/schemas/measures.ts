import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { writtenText } from './written.ts';

/**
 * Where a protective measure acts, in the order in which it is sought.
 *
 * Units: none. Valid: closed list. Source: [common].
 */
export const MEASURE_KINDS = ['at the tunnel', 'in the ground', 'at the building'] as const;

/**
 * How far a protective measure is.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const MEASURE_STATES = ['proposed', 'agreed', 'in place', 'done', 'given up'] as const;

/**
 * Words that name usual measures, by where they act; others are taken as they are written.
 *
 * Units: none. Valid: read only. Source: [common].
 */
export const MEASURE_WORDS: Readonly<Record<(typeof MEASURE_KINDS)[number], readonly string[]>> = {
  'at the tunnel': [
    'Volume loss kept to a limit',
    'Face pressure kept up',
    'Other sequence of driving',
  ],
  'in the ground': ['Compensation grouting', 'Permeation grouting', 'Cut-off wall or row of piles'],
  'at the building': [
    'Propping',
    'Ties and straps',
    'Underpinning',
    'Protection of windows and finishes',
  ],
};

/**
 * How long what is written of a measure may be, and how many buildings one may be for.
 *
 * Units: letters, pieces. Valid: read only. Source: [own].
 */
export const MEASURE_LIMITS = {
  title: 200,
  detail: 2000,
  responsible: 200,
  buildings: 500,
} as const;

const chainage = z.number().min(0).max(LIMITS.coordinate);

/**
 * A limit of volume loss along a stretch of the line.
 *
 * Units: volumeLoss m/m, chainages m along the drawn line. Valid: from below to; at most 10 %.
 * Source: [own].
 */
export const lossLimitSchema = z
  .strictObject({
    volumeLoss: z.number('Write a number.').positive().max(0.1, 'At most 10 %.'),
    from: chainage,
    to: chainage,
  })
  .refine(({ from, to }) => from < to, {
    path: ['to'],
    error: 'The end has to be beyond the start.',
  });

/**
 * What is written of a protective measure.
 *
 * Units: as lossLimitSchema; due is a day. Valid: only a measure at the tunnel limits volume loss; buildings
 * are of the scheme. Source: [own].
 */
export const measureValuesSchema = z
  .strictObject({
    kind: z.enum(MEASURE_KINDS),
    title: writtenText(MEASURE_LIMITS.title).min(1, 'Say what is done.'),
    detail: writtenText(MEASURE_LIMITS.detail),
    state: z.enum(MEASURE_STATES),
    responsible: writtenText(MEASURE_LIMITS.responsible),
    due: z.iso.date().nullable(),
    limit: lossLimitSchema.nullable(),
    buildings: z
      .array(z.number().int().min(1).max(2_147_483_647))
      .min(1, 'Name at least one building.')
      .max(MEASURE_LIMITS.buildings),
  })
  .refine(({ kind, limit }) => limit === null || kind === 'at the tunnel', {
    path: ['limit'],
    error: 'Only a measure at the tunnel limits the volume loss.',
  });

/**
 * What is written of a protective measure.
 *
 * Units: as measureValuesSchema. Valid: parsed by it. Source: [own].
 */
export type MeasureValues = z.infer<typeof measureValuesSchema>;

/**
 * A change of a measure, on top of the version that was seen.
 *
 * Units: as measureValuesSchema. Valid: an older version is refused. Source: [own].
 */
export const changeMeasureSchema = z.strictObject({
  version: z.number().int().min(1),
  values: measureValuesSchema,
});

/**
 * The address of a measure.
 *
 * Units: none. Valid: a measure of the scheme. Source: [own].
 */
export const measureParamsSchema = z.object({ schemeId: z.string(), measureId: z.uuid() });

/**
 * Which measures are asked for: all of a scheme, or those of one building.
 *
 * Units: none. Valid: any building's number. Source: [own].
 */
export const measuresQuerySchema = z.object({
  building: z.coerce.number().int().min(1).max(2_147_483_647).optional(),
});

/**
 * A protective measure.
 *
 * Units: as measureValuesSchema. Valid: version grows with every change; buildings by reference.
 * Source: [own].
 */
export const measureSchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(MEASURE_KINDS),
  title: z.string(),
  detail: z.string(),
  state: z.enum(MEASURE_STATES),
  responsible: z.string(),
  due: z.string().nullable(),
  limit: lossLimitSchema.nullable(),
  buildings: z.array(
    z.strictObject({ id: z.number(), reference: z.string(), name: z.string().nullable() }),
  ),
  version: z.number(),
  createdBy: z.string(),
  changedAt: z.iso.datetime(),
});

/**
 * A protective measure.
 *
 * Units: as measureSchema. Valid: parsed by it. Source: [own].
 */
export type Measure = z.infer<typeof measureSchema>;

/**
 * Measures, those that are due first before others.
 *
 * Units: as measureSchema. Valid: at most 1,000. Source: [own].
 */
export const measuresSchema = z.array(measureSchema);
