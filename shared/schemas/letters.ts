import { z } from 'zod';
import { LETTER_LIMITS } from './letter-limits.ts';
import { LETTER_KINDS } from './letter-settings.ts';
import { writtenText } from './written.ts';

const kind = z.enum(LETTER_KINDS);

/**
 * A part of a letter: a paragraph, a list, or the link to the owner's page.
 *
 * Units: none. Valid: in the order of the letter. Source: [own].
 */
export const letterPartSchema = z.union([
  z.string(),
  z.strictObject({ list: z.array(z.string()) }),
  z.strictObject({ link: z.string() }),
]);

/**
 * Why somebody gets a letter: what the rule says, and of which building.
 *
 * Units: none. Valid: building by reference or address; null where somebody was chosen by hand. Source: [own].
 */
export const letterReasonSchema = z.strictObject({
  why: z.string(),
  building: z.string().nullable(),
});

/**
 * Why somebody gets a letter.
 *
 * Units: none. Valid: parsed by letterReasonSchema. Source: [own].
 */
export type LetterReason = z.infer<typeof letterReasonSchema>;

/**
 * A letter of the same kind that somebody had for the same building already, or that waits for them in
 * another batch; `buildings` by address, name or reference.
 *
 * Units: none. Valid: sentAt null while it waits; not where its mail failed. Source: [own].
 */
export const earlierLetterSchema = z.strictObject({
  batchNumber: z.number().int(),
  sentAt: z.iso.datetime().nullable(),
  buildings: z.array(z.string()),
});

/**
 * A letter of the same kind that somebody had already.
 *
 * Units: none. Valid: parsed by earlierLetterSchema. Source: [own].
 */
export type EarlierLetter = z.infer<typeof earlierLetterSchema>;

/**
 * Where a letter stands on its way.
 *
 * Units: none. Valid: closed list; post is on the record once its batch is printed. Source: [own].
 */
export const DELIVERY_STATES = [
  'not sent',
  'waiting',
  'sent',
  'sent again after a stop',
  'failed',
  'to be printed',
  'printed',
] as const;

const listed = {
  id: z.uuid(),
  number: z.number().int(),
  name: z.string(),
  channel: z.enum(['e-mail', 'post']),
  delivery: z.enum(DELIVERY_STATES),
  serverWords: z.string().nullable(),
  answerBy: z.string().nullable(),
  acknowledgedAt: z.iso.datetime().nullable(),
  remindedAt: z.iso.datetime().nullable(),
};

/**
 * A letter in a list.
 *
 * Units: days. Valid: name empty where personal data were erased and the caller may not see them.
 * Source: [own].
 */
export const listedLetterSchema = z.strictObject({
  ...listed,
  batchNumber: z.number().int(),
  kind,
  batchId: z.uuid(),
});

/**
 * A letter in a list.
 *
 * Units: as listedLetterSchema. Valid: parsed by it. Source: [own].
 */
export type ListedLetter = z.infer<typeof listedLetterSchema>;

/**
 * A letter as it was written, whole.
 *
 * Units: none. Valid: never changes. Source: [own].
 */
export const letterSchema = z.strictObject({
  ...listed,
  address: z.string(),
  email: z.string().nullable(),
  subject: z.string(),
  parts: z.array(letterPartSchema),
  reasons: z.array(letterReasonSchema),
});

/**
 * A letter as it was written.
 *
 * Units: none. Valid: parsed by letterSchema. Source: [own].
 */
export type Letter = z.infer<typeof letterSchema>;

/**
 * The address of a letter that was written.
 *
 * Units: none. Valid: of the scheme. Source: [own].
 */
export const writtenLetterParamsSchema = z.object({
  schemeId: z.string(),
  writtenLetterId: z.uuid(),
});

/**
 * How long letters have not been answered: past the day that was asked for, or so long that somebody has to
 * call or go.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
const OVERDUE = ['answer', 'call'] as const;

/**
 * Which letters are asked for: of a building, of a party, or those that have not been answered in time.
 *
 * Units: none. Valid: one of them or none. Source: [own].
 */
export const lettersQuerySchema = z.object({
  building: z.coerce.number().int().min(1).max(2_147_483_647).optional(),
  party: z.uuid().optional(),
  overdue: z.enum(OVERDUE).optional(),
});

/**
 * Letters, the newest first.
 *
 * Units: as listedLetterSchema. Valid: at most 1,000. Source: [own].
 */
export const listedLettersSchema = z.array(listedLetterSchema);

/**
 * That a letter was acknowledged in another way than on the owner's page.
 *
 * Units: none. Valid: how, in a few words. Source: [own].
 */
export const acknowledgementSchema = z.strictObject({
  how: writtenText(LETTER_LIMITS.why).min(1, 'Say how.'),
});
