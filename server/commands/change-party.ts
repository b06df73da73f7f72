import { randomUUID } from 'node:crypto';
import type { InterestValues, PartyValues } from '../../shared/schemas/parties.ts';
import type { FoundParty } from '../models/parties.ts';
import { insertPartyChanges } from '../models/party-changes.ts';
import type { Scheme } from '../models/scheme.ts';
import { deleteInterests, insertInterests, updateParty } from '../models/write-parties.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import {
  changedValues,
  readParty,
  requireSoundParty,
  takeParty,
  toldOfParty,
} from './kept-party.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

function keyOf({ buildingId, kind, from, to }: InterestValues): string {
  return `${buildingId} ${kind} ${from} ${to}`;
}

/** Which interests go and which come; those that are alike stay as they are. */
function difference(kept: FoundParty, wanted: readonly InterestValues[]) {
  const held = new Map(
    kept.interests.map((one) => [keyOf({ ...one, buildingId: one.building.id }), one.id]),
  );
  const asked = new Map(wanted.map((one) => [keyOf(one), one]));
  return {
    gone: [...held].filter(([key]) => !asked.has(key)).map(([, id]) => id),
    come: [...asked].filter(([key]) => !held.has(key)).map(([, one]) => one),
  };
}

/** Changes a party, unless somebody else has changed it since it was seen. */
export async function changeParty(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  asked: { readonly id: string; readonly version: number; readonly values: PartyValues },
): Promise<FoundParty> {
  const { id, values } = asked;
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const kept = await takeParty(database, scheme.id, asked, transaction);
    await requireSoundParty(database, scheme.id, values, kept, transaction);
    const { gone, come } = difference(kept, values.interests);
    await updateParty(database, id, values, transaction);
    await deleteInterests(database, gone, transaction);
    const held = come.map((one) => ({ id: randomUUID(), partyId: id, ...one }));
    await insertInterests(database, held, transaction);
    const party = await readParty(database, scheme.id, id, transaction);
    const [before, after] = [toldOfParty(kept), toldOfParty(party)];
    const history = { partyId: id, action: 'changed', before, after } as const;
    await insertPartyChanges(database, by.id, [history], transaction);
    const subject = { kind: 'party', id };
    const change = { by, schemeId: scheme.id, action: 'change party', subject };
    await recordChange(
      { ...change, after: { changed: changedValues(before, after) } },
      transaction,
    );
    return party;
  });
}
