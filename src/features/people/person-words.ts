import type { PersonAnswer } from '../../../shared/schemas/people.ts';
import type { Role } from '../../../shared/schemas/roles.ts';
import type { State } from '../../components/ui/state-mark.tsx';
import { formatShortDay } from '../../lib/format-date.ts';

/** Whether somebody can sign in, as shape and words. */
export function signInState(
  {
    hasPassword,
    invitedUntil,
    shutOutAt,
  }: Pick<PersonAnswer, 'hasPassword' | 'invitedUntil' | 'shutOutAt'>,
  now: Date,
): { readonly state: State; readonly words: string } {
  if (shutOutAt !== null) return { state: 'not-started', words: 'Shut out' };
  if (hasPassword) return { state: 'done', words: 'Can sign in' };
  if (invitedUntil === null) return { state: 'not-started', words: 'Not invited' };
  if (new Date(invitedUntil) < now) return { state: 'not-started', words: 'Invitation too old' };
  return { state: 'in-hand', words: `Invited until ${formatShortDay(invitedUntil)}` };
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
