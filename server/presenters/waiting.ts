import type { Role } from '../../shared/schemas/roles.ts';
import type { WaitingAnswer, WaitingItem } from '../../shared/schemas/waiting.ts';
import type { DecisionsWaiting } from '../models/find-decisions-waiting.ts';
import type { OwnersWaiting } from '../models/find-owners-waiting.ts';
import type { OwnScheme } from '../models/find-schemes.ts';
import type { SchemeState } from '../models/find-scheme-states.ts';
import { holds } from '../policies/actor.ts';
import { schemePolicy } from '../policies/scheme-policy.ts';
import { presentDecisionsWaiting } from './waiting-decisions.ts';
import { presentOwnersWaiting } from './waiting-owners.ts';

/** Without one of each a scheme cannot be carried through; owners come with their buildings. */
const NEEDED: readonly Role[] = ['designer', 'assessor', 'witness'];

function inWords(roles: readonly Role[]): string {
  const others = roles.slice(0, -1).join(', ');
  return [others, ...roles.slice(-1)].filter((part) => part !== '').join(' or ');
}

/** Invitations that nobody has accepted: one thing, or none where all are. */
export function invitationsWaiting(count: number, since: Date | null, link: string): WaitingItem[] {
  if (count === 0 || since === null) return [];
  const text = count === 1 ? 'Invitation not accepted yet.' : 'Invitations not accepted yet.';
  return [{ kind: 'invitations-not-accepted', count, text, since: since.toISOString(), link }];
}

function waitingForAdministrator(page: string, since: string, state: SchemeState): WaitingItem[] {
  const missing = NEEDED.filter((role) => !state.filled.includes(role));
  const count = missing.length;
  const text = `Nobody is ${inWords(missing)} yet.`;
  const link = `${page}/settings/people`;
  const roles: WaitingItem = { kind: 'roles-not-filled', count, text, since, link };
  return [
    ...(count === 0 ? [] : [roles]),
    ...invitationsWaiting(state.invited, state.invitedSince, link),
  ];
}

function waitingIn(
  { scheme, actor }: OwnScheme,
  state: SchemeState,
  decisions: DecisionsWaiting | undefined,
  owners: OwnersWaiting | undefined,
): WaitingItem[] {
  const since = scheme.createdAt.toISOString();
  const page = `/schemes/${scheme.id}`;
  const one = { count: 1, since };
  const buildings = 'The register has no buildings yet.';
  const background = 'The map has no streets, water, rail or parks yet.';
  return [
    ...(schemePolicy.checkDecisions(actor) && decisions !== undefined
      ? presentDecisionsWaiting(page, decisions)
      : []),
    ...(owners === undefined ? [] : presentOwnersWaiting(page, actor, owners)),
    ...(schemePolicy.manageMembers(actor) ? waitingForAdministrator(page, since, state) : []),
    ...(holds(actor, 'assessor') && !state.hasBuildings
      ? [{ ...one, kind: 'no-buildings' as const, text: buildings, link: `${page}/plan` }]
      : []),
    ...(schemePolicy.updateBackground(actor) && !state.hasBackground
      ? [
          {
            ...one,
            kind: 'no-background' as const,
            text: background,
            link: `${page}/settings/background`,
          },
        ]
      : []),
  ];
}

/** What waits for a person in each of their schemes. */
export function presentWaitingSchemes(
  schemes: readonly OwnScheme[],
  states: readonly SchemeState[],
  decisions: readonly DecisionsWaiting[],
  owners: readonly OwnersWaiting[],
): WaitingAnswer['schemes'] {
  return schemes.map((own) => {
    const { id, name, archivedAt } = own.scheme;
    const state = states.find((one) => one.id === id);
    const ofDecisions = decisions.find(({ schemeId }) => schemeId === id);
    const ofOwners = owners.find(({ schemeId }) => schemeId === id);
    const waiting =
      state === undefined || archivedAt !== null
        ? []
        : waitingIn(own, state, ofDecisions, ofOwners);
    return {
      scheme: { id, name, archivedAt: archivedAt?.toISOString() ?? null },
      roles: [...own.actor.roles].sort(),
      waiting,
    };
  });
}
