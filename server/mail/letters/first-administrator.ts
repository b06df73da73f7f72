import type { IssuedLink } from '../../commands/issue-link.ts';
import type { Letter } from '../mailer.ts';
import { renderLetter } from '../render-letter.ts';
import { timeInWords } from './time-in-words.ts';

type Facts = {
  readonly person: { readonly name: string; readonly email: string };
  readonly link: IssuedLink;
};

/** Asks in whoever was named when the program was started, before anybody could ask them. */
export function firstAdministratorLetter({ person, link }: Facts): Letter {
  return renderLetter({ id: link.id, to: person.email, subject: 'Invitation to Groundsill' }, [
    `${person.name},`,
    'Groundsill has been set up, and you are named as its first administrator: you make schemes and ask other people in.',
    { label: 'Choose a password to begin', url: link.url },
    `The link works once, until ${timeInWords(link.until)}. After that, whoever runs Groundsill starts it again for a new one.`,
    'If you did not expect this letter, do nothing: without the link nobody can sign in as you.',
  ]);
}
