import { z } from 'zod';
import { answerDaysSchema, holidaysSchema, repairsSchema, timeZoneSchema } from './owner-terms.ts';
import { coordinateSchema } from './places.ts';
import { registerFilterSchema } from './register.ts';
import { writtenLine } from './written.ts';

/**
 * What letters to owners are for, in the order in which a scheme sends them.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const LETTER_KINDS = [
  'first information',
  'condition survey',
  'access request',
  'when the tunnel passes',
  'decision and measures',
  'free text',
] as const;

/**
 * What a letter to owners is for.
 *
 * Units: none. Valid: one of LETTER_KINDS. Source: [own].
 */
export type LetterKind = (typeof LETTER_KINDS)[number];

/**
 * The most that the settings of letters hold.
 *
 * Units: letters for texts, pieces, days, m. Valid: read only. Source: [own].
 */
export const SETTINGS_LIMITS = {
  rules: 40,
  milestones: 20,
  title: 200,
  words: 500,
  address: 8,
  days: 365,
  years: 100,
  near: 1000,
} as const;

const days = z.number('Write a number.').int().min(1).max(SETTINGS_LIMITS.days);
const metres = z.number('Write a number.').positive().max(SETTINGS_LIMITS.near);

/**
 * A place that buildings may be near to, as a work site.
 *
 * Units: m in the scheme's grid. Valid: up to 1 km away. Source: [own].
 */
export const nearPlaceSchema = z.strictObject({
  name: writtenLine(SETTINGS_LIMITS.title).min(1, 'Name the place.'),
  east: coordinateSchema,
  north: coordinateSchema,
  metres,
});

/**
 * Who gets a letter and why: everybody with an interest in a building of the register that the filter means,
 * that is near the place, where there is one, that is so near to a shaft of the line, where that is meant,
 * and that is listed, where only such are meant. `why` is what the record says of each building.
 *
 * Units: as registerFilterSchema and nearPlaceSchema; shaftWithin m. Valid: a source and a day always; older
 * versions know no shafts. Source: [own].
 */
export const letterRuleSchema = z.strictObject({
  kind: z.enum(LETTER_KINDS),
  why: writtenLine(SETTINGS_LIMITS.title).min(1, 'Say why they get it.'),
  filter: registerFilterSchema,
  near: nearPlaceSchema.nullable(),
  shaftWithin: metres.nullable().default(null),
  listedOnly: z.boolean(),
  source: writtenLine(SETTINGS_LIMITS.title).min(1, 'Say where this comes from.'),
  date: z.iso.date('Write a day.'),
  isOn: z.boolean(),
});

/**
 * A rule of who gets a letter.
 *
 * Units: as letterRuleSchema. Valid: parsed by it. Source: [own].
 */
export type LetterRule = z.infer<typeof letterRuleSchema>;

/**
 * What letters of a scheme go by: who gets which, how long owners have, whom they may ask, what happens
 * when, on what ground and for how long letters are kept once personal data are erased, what is said of
 * repairs, by when owners are answered, and in which time zone and round which holidays that is.
 *
 * Units: days; answerDays working days; keepYears years. Valid: a reminder goes out after the answer was due,
 * the escalation list follows it; what older versions do not say is as by default. Source: [own]; default days [common].
 */
export const letterSettingsSchema = z
  .strictObject({
    rules: z.array(letterRuleSchema).max(SETTINGS_LIMITS.rules),
    answerWithin: days,
    remindAfter: days,
    escalateAfter: days,
    contact: z.strictObject({
      name: writtenLine(SETTINGS_LIMITS.title).min(1, 'Say who answers.'),
      email: z.email('Write an e-mail address.'),
      phone: writtenLine(60),
      hours: writtenLine(SETTINGS_LIMITS.title),
      address: z.array(writtenLine(SETTINGS_LIMITS.title).min(1)).max(SETTINGS_LIMITS.address),
    }),
    milestones: z
      .array(
        z.strictObject({
          when: writtenLine(60).min(1, 'Say when.'),
          title: writtenLine(SETTINGS_LIMITS.title).min(1, 'Say what.'),
          words: writtenLine(SETTINGS_LIMITS.words),
        }),
      )
      .max(SETTINGS_LIMITS.milestones),
    keepGround: writtenLine(SETTINGS_LIMITS.words).min(1, 'Say on what ground letters are kept.'),
    keepYears: z.number('Write a number.').int().min(1).max(SETTINGS_LIMITS.years),
    repairs: repairsSchema,
    answerDays: answerDaysSchema,
    timeZone: timeZoneSchema,
    holidays: holidaysSchema,
  })
  .refine(({ answerWithin, remindAfter }) => remindAfter >= answerWithin, {
    path: ['remindAfter'],
    error: 'Remind nobody before the answer was due.',
  })
  .refine(({ escalateAfter, remindAfter }) => escalateAfter > remindAfter, {
    path: ['escalateAfter'],
    error: 'Escalate after the reminder.',
  });

/**
 * What letters of a scheme go by.
 *
 * Units: as letterSettingsSchema. Valid: parsed by it. Source: [own].
 */
export type LetterSettings = z.infer<typeof letterSettingsSchema>;

/**
 * The next version of the settings, on top of the one that was seen; 0 where there was none.
 *
 * Units: as letterSettingsSchema. Valid: an older version is refused. Source: [own].
 */
export const newLetterSettingsSchema = z.strictObject({
  basedOn: z.number().int().min(0),
  settings: letterSettingsSchema,
});

/**
 * The settings that hold; version 0 are those that a scheme starts with.
 *
 * Units: as letterSettingsSchema. Valid: by and at null at version 0. Source: [own].
 */
export const heldLetterSettingsSchema = z.strictObject({
  version: z.number().int().min(0),
  settings: letterSettingsSchema,
  by: z.string().nullable(),
  at: z.iso.datetime().nullable(),
});

/**
 * The settings that hold.
 *
 * Units: as heldLetterSettingsSchema. Valid: parsed by it. Source: [own].
 */
export type HeldLetterSettings = z.infer<typeof heldLetterSettingsSchema>;

function defaultRules(date: string): LetterRule[] {
  const rule = {
    near: null,
    shaftWithin: null,
    listedOnly: false,
    source: 'common practice, no source',
    date,
    isOn: true,
  };
  const moves = { ranges: { settlement: { from: 1 } } };
  const sinks = { ...rule, why: 'The ground may sink by 1 mm or more', filter: moves };
  const listed = {
    ...sinks,
    why: 'A listed building, and the ground may sink by 1 mm or more',
    listedOnly: true,
  };
  const atWorst = (category: string[]) => ({ any: { categoryHigh: category } });
  return [
    { ...sinks, kind: 'first information' },
    {
      ...listed,
      kind: 'first information',
      why: 'A listed building, and the ground may move at all',
      filter: { ranges: { settlement: { from: 0.1 } } },
    },
    {
      ...rule,
      kind: 'first information',
      why: 'Within 30 m of a shaft',
      filter: {},
      shaftWithin: 30,
    },
    {
      ...rule,
      kind: 'condition survey',
      why: 'Cracks are possible',
      filter: atWorst(['1', '2', '3', '4']),
    },
    { ...listed, kind: 'condition survey' },
    { ...rule, kind: 'access request', why: 'Repairs are possible', filter: atWorst(['3', '4']) },
    { ...sinks, kind: 'when the tunnel passes' },
    {
      ...rule,
      kind: 'decision and measures',
      why: 'A decision has been checked',
      filter: { any: { state: ['decided'], stage: ['3'] } },
    },
  ];
}

/**
 * The settings that a scheme starts with, holding from a day on.
 *
 * Units: as letterSettingsSchema. Valid: the contact is to be put right before anything is sent.
 * Source: 1 mm and 30 m [common]; days [common].
 */
export function defaultLetterSettings(date: string): LetterSettings {
  return letterSettingsSchema.parse({
    rules: defaultRules(date),
    answerWithin: 21,
    remindAfter: 28,
    escalateAfter: 42,
    contact: {
      name: 'The owners’ line',
      email: 'owners@example.org',
      phone: '',
      hours: '',
      address: [],
    },
    milestones: [],
    keepGround:
      'Letters are evidence of what owners were told, until claims can no longer be made.',
    keepYears: 12,
  } satisfies z.input<typeof letterSettingsSchema>);
}
