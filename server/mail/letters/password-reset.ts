import type { IssuedLink } from '../../commands/issue-link.ts';
import type { OutgoingMail } from '../outbox.ts';
import { LINK_LEFT_OPEN } from '../render-letter.ts';
import { timeInWords } from './time-in-words.ts';

/** Lets somebody who has forgotten their password choose another. */
export function passwordResetMail(
  person: { readonly name: string; readonly email: string },
  link: Pick<IssuedLink, 'id' | 'until'>,
): OutgoingMail {
  return {
    ...{ schemeId: null, recipient: person.email, linkId: link.id },
    subject: 'A new password for Groundsill',
    parts: [
      `${person.name},`,
      'Somebody asked for a new password for your address at Groundsill.',
      { label: 'Choose a new password', url: LINK_LEFT_OPEN },
      `The link works once, until ${timeInWords(link.until)}. Once you have chosen, you are signed out wherever you were signed in.`,
      'If it was not you, do nothing: your password stays as it is.',
    ],
  };
}
