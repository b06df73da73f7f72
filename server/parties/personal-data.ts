import { readParty } from '../commands/kept-party.ts';
import { AppError } from '../errors.ts';
import { findMergedInto, findPartiesById } from '../models/parties.ts';
import { findPartyChanges } from '../models/party-changes.ts';
import { findPersonalData } from '../models/personal-data.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import { isHiddenFrom } from '../policies/is-hidden-from.ts';
import { presentParty } from '../presenters/party.ts';
import type { Services } from '../services.ts';

/**
 * All that is held of a party and of those merged into it, to be handed over to them. What is kept of an
 * erased one is there for the administrator alone.
 */
export async function personalData(
  { database }: Pick<Services, 'database'>,
  actor: Actor,
  scheme: Scheme,
  partyId: string,
): Promise<object> {
  const party = await readParty(database, scheme.id, partyId);
  if (isHiddenFrom(actor, party.erasedAt !== null)) throw new AppError('not-found');
  const merged = await findMergedInto(database, party.id);
  const ids = [party.id, ...merged];
  const [others, history, beside] = await Promise.all([
    findPartiesById(database, scheme.id, merged),
    findPartyChanges(database, ids),
    findPersonalData(database, ids),
  ]);
  return {
    scheme: scheme.name,
    takenOn: new Date().toISOString(),
    party: presentParty(party),
    mergedParties: others.map(presentParty),
    history,
    ...beside,
  };
}
