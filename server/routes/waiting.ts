import type { WaitingAnswer } from '../../shared/schemas/waiting.ts';
import { findDecisionsWaiting } from '../models/find-decisions-waiting.ts';
import { findOwnersWaiting } from '../models/find-owners-waiting.ts';
import { findInvitedOutside, findSchemeStates } from '../models/find-scheme-states.ts';
import { findSchemes } from '../models/find-schemes.ts';
import type { Actor } from '../policies/actor.ts';
import { invitationsWaiting, presentWaitingSchemes } from '../presenters/waiting.ts';
import type { Services } from '../services.ts';
import { defineRoute } from './define-route.ts';

async function answerWaiting({ database, env }: Services, actor: Actor): Promise<WaitingAnswer> {
  const schemes = await findSchemes(actor);
  const ids = schemes.map(({ scheme }) => scheme.id);
  const [states, decisions, owners] = await Promise.all([
    findSchemeStates(database, ids),
    findDecisionsWaiting(database, ids, actor.id),
    findOwnersWaiting(database, ids, actor.id),
  ]);
  const none = { invited: 0, since: null };
  const { invited, since } = actor.isAdministrator ? await findInvitedOutside(database) : none;
  return {
    general: invitationsWaiting(invited, since, '/people'),
    schemes: presentWaitingSchemes(
      schemes,
      // the demo's town stands on the demo's own map
      states.map((state) => ({
        ...state,
        hasBackground: state.hasBackground || (env.DEMO && state.hasBuildings),
      })),
      decisions,
      owners,
    ),
  };
}

export const waitingRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/waiting',
    access: 'signed-in',
    handle: ({ services, actor }) => answerWaiting(services, actor),
  }),
];
