import type { PersonAnswer } from '../../../shared/schemas/people.ts';
import type { Role } from '../../../shared/schemas/roles.ts';
import type { State } from '../../components/ui/state-mark.tsx';
import { formatShortDay } from '../../lib/format-date.ts';

/** Whether somebody can sign in, as shape and words. */
export function signInState(
  {
    hasPassword,
    invitedUntil,
    letter,
    shutOutAt,
  }: Pick<PersonAnswer, 'hasPassword' | 'invitedUntil' | 'letter' | 'shutOutAt'>,
  now: Date,
): { readonly state: State; readonly words: string } {
  if (shutOutAt !== null) return { state: 'not-started', words: 'Shut out' };
  if (hasPassword) return { state: 'done', words: 'Can sign in' };
  if (invitedUntil === null) return { state: 'not-started', words: 'Not invited' };
  if (new Date(invitedUntil) < now) return { state: 'not-started', words: 'Invitation too old' };
  if (letter?.state === 'failed') return { state: 'waiting', words: 'Letter not sent' };
  return { state: 'in-hand', words: `Invited until ${formatShortDay(invitedUntil)}` };
}

/** What keeps the letter of an invitation from going out, if anything does. */
export function letterTrouble({
  letter,
  email,
}: Pick<PersonAnswer, 'letter' | 'email'>): { failed: string; stands: string } | null {
  if (letter === null || letter.state === 'sent' || letter.serverWords === null) return null;
  const said = `The mail server said: “${letter.serverWords}”`;
  return letter.state === 'waiting'
    ? {
        failed: `The letter to ${email} has not gone out yet.`,
        stands: `It is tried again. ${said}`,
      }
    : { failed: `The letter to ${email} was not sent.`, stands: `The account is made. ${said}` };
}

export type Part = {
  readonly schemeId: string;
  readonly schemeName: string;
  readonly roles: Role[];
};

/** What somebody is in each scheme, in the order given. */
export function partsOf({ memberships }: Pick<PersonAnswer, 'memberships'>): Part[] {
  const parts = new Map<string, Part>();
  for (const { schemeId, schemeName, role } of memberships) {
    const part = parts.get(schemeId);
    if (part === undefined) parts.set(schemeId, { schemeId, schemeName, roles: [role] });
    else part.roles.push(role);
  }
  return [...parts.values()];
}

/** As "Port Dogger crossing: designer, assessor; North Mole sewer: witness". */
export function partsInWords(person: Pick<PersonAnswer, 'memberships'>): string {
  return partsOf(person)
    .map(({ schemeName, roles }) => `${schemeName}: ${roles.join(', ')}`)
    .join('; ');
}
