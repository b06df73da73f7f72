import type { Role } from '../../../shared/schemas/roles.ts';
import type { IssuedLink } from '../../commands/issue-link.ts';
import type { OutgoingMail } from '../outbox.ts';
import { LINK_LEFT_OPEN, type LetterPart } from '../render-letter.ts';
import { timeInWords } from './time-in-words.ts';

type Named = { readonly name: string; readonly email: string };

export type InvitationFacts = {
  readonly person: Named & { readonly isAdministrator: boolean };
  readonly inviter: Named;
  readonly parts: readonly { readonly schemeName: string; readonly roles: readonly Role[] }[];
  readonly link: Pick<IssuedLink, 'id' | 'until'>;
};

function partsInWords({ person, parts }: InvitationFacts): LetterPart[] {
  const lines = parts.map(({ schemeName, roles }) => `${schemeName}, as ${roles.join(' and ')}`);
  if (person.isAdministrator) lines.push('all schemes, as administrator');
  return lines.length === 0 ? [] : ['You take part in:', { list: lines }];
}

/** Asks somebody to choose a password, and says who asks, for what and until when. */
export function invitationMail(facts: InvitationFacts): OutgoingMail {
  const { person, inviter, parts, link } = facts;
  const [first] = parts;
  const to = parts.length === 1 && first !== undefined ? first.schemeName : 'Groundsill';
  return {
    ...{ schemeId: null, recipient: person.email, linkId: link.id },
    subject: `Invitation to ${to}`,
    parts: [
      `${person.name},`,
      `${inviter.name} (${inviter.email}) invites you to Groundsill. It shows what a new tunnel will do to the buildings above it, and keeps what is agreed about them.`,
      ...partsInWords(facts),
      { label: 'Choose a password to begin', url: LINK_LEFT_OPEN },
      `The link works once, until ${timeInWords(link.until)}. After that, ask ${inviter.name} for a new one.`,
      `If you did not expect this letter, do nothing: without the link nobody can sign in as you. If you wonder why it came, write to ${inviter.email}.`,
    ],
  };
}
