import type { MailboxEntryAnswer, MailboxLetterAnswer } from '../../shared/schemas/mailbox.ts';
import type { MailboxLetter } from '../models/mailbox-letter.ts';

/** A letter in the list. */
export function presentMailboxEntry(letter: MailboxLetter): MailboxEntryAnswer {
  return {
    id: letter.id,
    receivedAt: letter.receivedAt.toISOString(),
    from: letter.sender,
    to: letter.recipient,
    subject: letter.subject,
  };
}

/** A letter with what it says. */
export function presentMailboxLetter(letter: MailboxLetter): MailboxLetterAnswer {
  const { text, html, attachments } = letter;
  const names = attachments.map(({ name }) => name);
  return { ...presentMailboxEntry(letter), text, html, attachments: names };
}
