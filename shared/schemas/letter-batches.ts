import { z } from 'zod';
import { letterExceptions } from './letter-exceptions.ts';
import { LETTER_LIMITS } from './letter-limits.ts';
import { LETTER_KINDS } from './letter-settings.ts';
import { letterWordsSchema } from './letter-templates.ts';
import { earlierLetterSchema, letterReasonSchema, listedLetterSchema } from './letters.ts';
import { writtenText } from './written.ts';

const kind = z.enum(LETTER_KINDS);

/**
 * Which letters would be made: who is left out and who is chosen by hand.
 *
 * Units: none. Valid: a reason for each of them. Source: [own].
 */
export const batchPreviewSchema = z.strictObject({ kind, ...letterExceptions });

/**
 * Which letters would be made.
 *
 * Units: none. Valid: parsed by batchPreviewSchema. Source: [own].
 */
export type BatchPreview = z.infer<typeof batchPreviewSchema>;

/**
 * A batch of letters to be made; `expected` is how many letters were seen before. Free text is written for the
 * batch, all other kinds go by their template.
 *
 * Units: none. Valid: refused where another number would be made by now. Source: [own].
 */
export const newBatchSchema = batchPreviewSchema
  .extend({ text: letterWordsSchema.nullable(), expected: z.number().int().min(1) })
  .refine((asked) => (asked.kind === 'free text') === (asked.text !== null), {
    path: ['text'],
    error: 'Free text is written with its letters, and nothing else is.',
  });

/**
 * A batch of letters to be made.
 *
 * Units: none. Valid: parsed by newBatchSchema. Source: [own].
 */
export type NewBatch = z.infer<typeof newBatchSchema>;

/**
 * Who gets a letter of a kind and why, and how many letters that makes; `short` lists at most so many.
 *
 * Units: pieces. Valid: `without` counts buildings that a rule names and that nobody has an interest in;
 * `earlier` of a party is the newest first.
 * Source: [own].
 */
export const recipientsSchema = z.strictObject({
  letters: z.number().int(),
  byMail: z.number().int(),
  byPost: z.number().int(),
  runNumber: z.number().int().nullable(),
  without: z.number().int(),
  recipients: z.array(
    z.strictObject({
      partyId: z.uuid(),
      name: z.string(),
      channel: z.enum(['e-mail', 'post']),
      reasons: z.array(letterReasonSchema),
      leftOut: z.string().nullable(),
      earlier: z.array(earlierLetterSchema),
    }),
  ),
});

/**
 * Who gets a letter of a kind and why.
 *
 * Units: as recipientsSchema. Valid: parsed by it. Source: [own].
 */
export type Recipients = z.infer<typeof recipientsSchema>;

/**
 * Where a batch of letters stands.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const BATCH_STATES = [
  'waiting for check',
  'returned',
  'withdrawn',
  'checked',
  'sent',
] as const;

/**
 * How many letters of a batch are where.
 *
 * Units: pieces. Valid: once it is sent. Source: [own].
 */
export const deliveriesSchema = z.strictObject({
  waiting: z.number().int(),
  sent: z.number().int(),
  sentAgain: z.number().int(),
  failed: z.number().int(),
  post: z.number().int(),
  acknowledged: z.number().int(),
});

/**
 * A batch of letters: prepared by one person, checked by another, then sent.
 *
 * Units: none. Valid: moves on only. Source: [own].
 */
export const batchSchema = z.strictObject({
  id: z.uuid(),
  number: z.number().int(),
  kind,
  state: z.enum(BATCH_STATES),
  templateVersion: z.number().int(),
  settingsVersion: z.number().int(),
  runNumber: z.number().int().nullable(),
  letters: z.number().int(),
  byPost: z.number().int(),
  preparedBy: z.string(),
  preparedById: z.uuid(),
  preparedAt: z.iso.datetime(),
  checkedBy: z.string().nullable(),
  checkedAt: z.iso.datetime().nullable(),
  comment: z.string().nullable(),
  sentBy: z.string().nullable(),
  sentAt: z.iso.datetime().nullable(),
  printedAt: z.iso.datetime().nullable(),
  deliveries: deliveriesSchema.nullable(),
});

/**
 * A batch of letters.
 *
 * Units: none. Valid: parsed by batchSchema. Source: [own].
 */
export type Batch = z.infer<typeof batchSchema>;

/**
 * Batches, the newest first.
 *
 * Units: none. Valid: of one scheme. Source: [own].
 */
export const batchesSchema = z.array(batchSchema);

const keptException = z.strictObject({
  partyId: z.uuid().nullable(),
  name: z.string(),
  why: z.string(),
});

/**
 * A batch with its letters, who was left out and who was chosen by hand; `text` is what was written for it,
 * with its marks, `earlier` which of its letters go to somebody who had one like it.
 *
 * Units: as batchSchema. Valid: letters by number; text of free text only; exceptions under the party that
 * stands today, null where no letter can go to them any more. Source: [own].
 */
export const batchDetailSchema = z.strictObject({
  batch: batchSchema,
  text: letterWordsSchema.nullable(),
  letters: z.array(listedLetterSchema),
  earlier: z.array(z.strictObject({ letterId: z.uuid(), had: z.array(earlierLetterSchema) })),
  leftOut: z.array(keptException),
  chosen: z.array(keptException),
});

/**
 * A batch with its letters and exceptions.
 *
 * Units: as batchDetailSchema. Valid: parsed by it. Source: [own].
 */
export type BatchDetail = z.infer<typeof batchDetailSchema>;

/**
 * The check of a batch.
 *
 * Units: none. Valid: a returned one needs a comment. Source: [own].
 */
export const checkBatchSchema = z
  .strictObject({
    verdict: z.enum(['checked', 'returned']),
    comment: writtenText(LETTER_LIMITS.comment),
  })
  .refine(({ verdict, comment }) => verdict === 'checked' || comment !== '', {
    path: ['comment'],
    error: 'Say what has to change.',
  });

/**
 * The address of a batch and of a letter in it.
 *
 * Units: none. Valid: of the scheme. Source: [own].
 */
export const batchParamsSchema = z.object({ schemeId: z.string(), batchId: z.uuid() });
