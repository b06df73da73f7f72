import { z } from 'zod';

const envelope = {
  id: z.number(),
  receivedAt: z.iso.datetime(),
  from: z.string(),
  to: z.string(),
  subject: z.string(),
};

/**
 * A letter in the list of the demo's mailbox.
 *
 * Units: none. Valid: in the demo only. Source: [own].
 */
export const mailboxEntrySchema = z.strictObject(envelope);

/**
 * A letter of the demo's mailbox. Its html comes from outside: show it in a frame without scripts.
 *
 * Units: none. Valid: in the demo only; html null where the letter had none; attachments by name. Source: [own].
 */
export const mailboxLetterSchema = z.strictObject({
  ...envelope,
  text: z.string(),
  html: z.string().nullable(),
  attachments: z.array(z.string()),
});

/**
 * A letter in the list of the demo's mailbox.
 *
 * Units: as mailboxEntrySchema. Valid: parsed by it. Source: [own].
 */
export type MailboxEntryAnswer = z.infer<typeof mailboxEntrySchema>;

/**
 * A letter of the demo's mailbox.
 *
 * Units: as mailboxLetterSchema. Valid: parsed by it. Source: [own].
 */
export type MailboxLetterAnswer = z.infer<typeof mailboxLetterSchema>;
