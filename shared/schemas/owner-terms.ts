import { z } from 'zod';
import type { MatterKind } from './matters.ts';
import { writtenLine } from './written.ts';

const LIMITS = { words: 500, source: 200, name: 100, holidays: 200, days: 60 } as const;

/** Offsets are left out, since they do not know of summer. */
function isTimeZone(name: string): boolean {
  if (!/^[A-Za-z]/.test(name)) return false;
  try {
    return new Intl.DateTimeFormat('en-GB', { timeZone: name }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
}

/**
 * What the promoter says of repairs and of who pays for them, in plain words and as it is told to owners, with
 * where that was laid down.
 *
 * Units: none. Valid: where nothing was written, nothing is promised. Source: [own].
 */
export const repairsSchema = z
  .strictObject({
    words: writtenLine(LIMITS.words).min(1, 'Say what owners are told of repairs.'),
    source: writtenLine(LIMITS.source).min(1, 'Say where this comes from.'),
  })
  .default({
    words: 'Tell us about any crack. We will come and look.',
    source: 'no promise yet',
  });

/**
 * The time zone in which owners are told times, by its name in the IANA database.
 *
 * Units: none. Valid: a zone that is known where it is read; UTC where none was written. Source: [own].
 */
export const timeZoneSchema = z
  .string()
  .max(LIMITS.name)
  .refine(isTimeZone, 'Write the name of a time zone, as Europe/London.')
  .default('UTC');

/**
 * Public holidays: days on which nobody is expected to answer.
 *
 * Units: none. Valid: in any order; none where none were written. Source: [own].
 */
export const holidaysSchema = z
  .array(
    z.strictObject({
      date: z.iso.date('Write a day as 2027-05-03.'),
      name: writtenLine(LIMITS.name).min(1, 'Name the holiday.'),
    }),
  )
  .max(LIMITS.holidays, `At most ${LIMITS.holidays} holidays.`)
  .default([]);

/**
 * A public holiday.
 *
 * Units: none. Valid: parsed by holidaysSchema. Source: [own].
 */
export type Holiday = z.infer<typeof holidaysSchema>[number];

const answerDays = z.number('Write a number.').int().min(1).max(LIMITS.days);

/**
 * By when an owner is answered.
 *
 * Units: working days: Monday to Friday, but for public holidays. Valid: 1 to 60. Source: [own], as common
 * practice has no single figure; cracks are looked at first.
 */
export const answerDaysSchema = z
  .strictObject({
    question: answerDays,
    concern: answerDays,
    claim: answerDays,
    correction: answerDays,
  } satisfies Record<MatterKind, z.ZodNumber>)
  .default({ question: 5, concern: 2, claim: 10, correction: 10 });

/**
 * By when an owner is answered.
 *
 * Units: as answerDaysSchema. Valid: parsed by it. Source: [own].
 */
export type AnswerDays = z.infer<typeof answerDaysSchema>;
