import type { IssuedLink } from '../../commands/issue-link.ts';
import type { Letter } from '../mailer.ts';
import { renderLetter } from '../render-letter.ts';
import { timeInWords } from './time-in-words.ts';

/** Lets somebody who has forgotten their password choose another. */
export function passwordResetLetter(
  person: { readonly name: string; readonly email: string },
  link: IssuedLink,
): Letter {
  return renderLetter({ id: link.id, to: person.email, subject: 'A new password for Groundsill' }, [
    `${person.name},`,
    'Somebody asked for a new password for your address at Groundsill.',
    { label: 'Choose a new password', url: link.url },
    `The link works once, until ${timeInWords(link.until)}. Once you have chosen, you are signed out wherever you were signed in.`,
    'If it was not you, do nothing: your password stays as it is.',
  ]);
}
