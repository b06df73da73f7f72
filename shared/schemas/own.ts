import { z } from 'zod';
import { answerDaysSchema, timeZoneSchema } from './owner-terms.ts';

const point = z.tuple([z.number(), z.number()]);
const category = z.union([z.literal(0), z.literal(1), z.literal(2), z.literal(3), z.literal(4)]);

/**
 * The address of a letter, as those whom it went to read it.
 *
 * Units: none. Valid: a letter that was sent to a party that the caller is or acts for. Source: [own].
 */
export const ownLetterParamsSchema = z.object({ schemeId: z.string(), ownLetterId: z.uuid() });

/**
 * A letter that an owner was sent. `buildings` are those of the owner's own that it names.
 *
 * Units: answerBy is a day. Valid: sent letters only. Source: [own].
 */
export const ownLetterSchema = z.strictObject({
  id: z.uuid(),
  subject: z.string(),
  sentAt: z.iso.datetime(),
  answerBy: z.string().nullable(),
  acknowledgedAt: z.iso.datetime().nullable(),
  buildings: z.array(z.number()),
});

/**
 * A letter that an owner was sent.
 *
 * Units: as ownLetterSchema. Valid: parsed by it. Source: [own].
 */
export type OwnLetter = z.infer<typeof ownLetterSchema>;

/**
 * The letters that an owner was sent, the newest first.
 *
 * Units: as ownLetterSchema. Valid: at most 500. Source: [own].
 */
export const ownLettersSchema = z.array(ownLetterSchema);

/**
 * A letter with its text, as it was sent.
 *
 * Units: as ownLetterSchema. Valid: never changes but for its acknowledgement. Source: [own].
 */
export const ownLetterTextSchema = ownLetterSchema.extend({
  name: z.string(),
  parts: z.array(z.union([z.string(), z.strictObject({ list: z.array(z.string()) })])),
});

/**
 * A letter with its text.
 *
 * Units: as ownLetterTextSchema. Valid: parsed by it. Source: [own].
 */
export type OwnLetterText = z.infer<typeof ownLetterTextSchema>;

/**
 * What the newest letter to an owner said of a building, with the tunnels near it.
 *
 * Units: as OwnerFacts; diameter m; lines in longitude and latitude. Valid: from the run of the newest letter
 * that was sent to them and names the building. Source: mair-taylor-burland-1996.
 */
export const ownFiguresSchema = z.strictObject({
  settlement: z.number().nullable(),
  most: z.number(),
  categoryLow: category.nullable(),
  category: category.nullable(),
  categoryHigh: category.nullable(),
  tunnels: z.number(),
  depth: z.number(),
  distance: z.number(),
  diameter: z.number(),
  lines: z.array(z.array(point)),
});

/**
 * A building of an owner's own and all that they are told of it.
 *
 * Units: outline in longitude and latitude, outer ring and holes of each part. Valid: figures are null until a
 * letter with figures has been sent; decision is told in words,
 * once it has been checked; measures are those that are agreed or further on. Source: [own].
 */
export const ownBuildingSchema = z.strictObject({
  id: z.number(),
  name: z.string().nullable(),
  address: z.string().nullable(),
  use: z.string().nullable(),
  outline: z.array(z.array(z.array(point))),
  figures: ownFiguresSchema.nullable(),
  decision: z.string().nullable(),
  measures: z.array(
    z.strictObject({ title: z.string(), state: z.enum(['agreed', 'in place', 'done']) }),
  ),
});

/**
 * A building of an owner's own.
 *
 * Units: as ownBuildingSchema. Valid: parsed by it. Source: [own].
 */
export type OwnBuilding = z.infer<typeof ownBuildingSchema>;

/**
 * Everything that an owner's page begins with.
 *
 * Units: as the parts; `answerDays` working days. Valid: milestones are none until an administrator has written
 * them; `repairs` is what the promoter says of them. Source: [own].
 */
export const ownSchema = z.strictObject({
  scheme: z.strictObject({ id: z.uuid(), name: z.string() }),
  contact: z.strictObject({
    name: z.string(),
    email: z.string(),
    phone: z.string(),
    hours: z.string(),
  }),
  milestones: z.array(z.strictObject({ when: z.string(), title: z.string(), words: z.string() })),
  repairs: z.string(),
  answerDays: answerDaysSchema,
  timeZone: timeZoneSchema,
  letters: ownLettersSchema,
  buildings: z.array(ownBuildingSchema),
});

/**
 * Everything that an owner's page begins with.
 *
 * Units: as ownSchema. Valid: parsed by it. Source: [own].
 */
export type Own = z.infer<typeof ownSchema>;
