import type { OutgoingMail } from '../outbox.ts';

/** Confirms to an owner that they have said that they read a letter. */
export function acknowledgedMail(
  person: { readonly name: string },
  letter: { readonly subject: string },
  page: string,
): Pick<OutgoingMail, 'subject' | 'parts'> {
  return {
    subject: 'Thank you, we know that you have our letter',
    parts: [
      `Dear ${person.name},`,
      `You told us that you have read our letter “${letter.subject}”. Thank you. We have made a note of it.`,
      'Nothing more is needed from you now. Your page shows what happens next, and when.',
      { label: 'Your page', url: page },
    ],
  };
}
