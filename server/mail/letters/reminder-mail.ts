import type { OutgoingMail } from '../outbox.ts';
import { ownerHomeUrl } from './owner-home-url.ts';

type Facts = {
  readonly schemeId: string;
  readonly publicUrl: string;
  readonly letter: {
    readonly id: string;
    readonly name: string;
    readonly email: string;
    readonly subject: string;
  };
  /** Whom to ask. */
  readonly contact: string;
};

/** Reminds an owner of a letter that they have not acknowledged. */
export function reminderMail({ schemeId, publicUrl, letter, contact }: Facts): OutgoingMail {
  return {
    ...{ schemeId, recipient: letter.email, letterId: letter.id, isReminder: true },
    subject: `A reminder: ${letter.subject}`,
    parts: [
      `Dear ${letter.name},`,
      'We wrote to you some time ago, and have not heard from you yet. Perhaps our letter did not reach you, or lies about.',
      'Please tell us on your page that you have it. That takes a minute.',
      { label: 'Open your page', url: ownerHomeUrl(publicUrl, schemeId) },
      `If you have no password yet, use the link in our first letter, or ask us: ${contact}.`,
    ],
  };
}
