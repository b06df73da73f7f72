import type { IssuedLink } from '../../commands/issue-link.ts';
import type { OutgoingMail } from '../outbox.ts';
import { LINK_LEFT_OPEN } from '../render-letter.ts';
import { timeInWords } from './time-in-words.ts';

type Facts = {
  readonly person: { readonly name: string; readonly email: string };
  readonly link: Pick<IssuedLink, 'id' | 'until'>;
};

/** Asks in whoever was named when the program was started, before anybody could ask them. */
export function firstAdministratorMail({ person, link }: Facts): OutgoingMail {
  return {
    ...{ schemeId: null, recipient: person.email, linkId: link.id },
    subject: 'Invitation to Groundsill',
    parts: [
      `${person.name},`,
      'Groundsill has been set up, and you are named as its first administrator: you make schemes and ask other people in.',
      { label: 'Choose a password to begin', url: LINK_LEFT_OPEN },
      `The link works once, until ${timeInWords(link.until)}. After that, whoever runs Groundsill starts it again for a new one.`,
      'If you did not expect this letter, do nothing: without the link nobody can sign in as you.',
    ],
  };
}
