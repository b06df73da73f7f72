import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { PartyValues } from '../../shared/schemas/parties.ts';
import type { FoundParty } from '../models/parties.ts';
import { insertPartyChanges } from '../models/party-changes.ts';
import type { Scheme } from '../models/scheme.ts';
import { insertInterests, insertParties } from '../models/write-parties.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readParty, requireSoundParty, toldOfParty } from './kept-party.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** Writes a new party within a transaction, with its history and the trail. */
export async function insertParty(
  database: Services['database'],
  by: Pick<Actor, 'id'> | null,
  scheme: Scheme,
  values: PartyValues,
  transaction: Transaction,
): Promise<FoundParty> {
  const { interests, ...fields } = values;
  await requireSoundParty(database, scheme.id, values, null, transaction);
  const id = randomUUID();
  await insertParties(database, scheme.id, [{ id, ...fields }], transaction);
  const held = interests.map((one) => ({ id: randomUUID(), partyId: id, ...one }));
  await insertInterests(database, held, transaction);
  const party = await readParty(database, scheme.id, id, transaction);
  const history = { partyId: id, action: 'added', before: null } as const;
  const after = toldOfParty(party);
  await insertPartyChanges(database, by?.id ?? null, [{ ...history, after }], transaction);
  const subject = { kind: 'party', id };
  const change = { by, schemeId: scheme.id, action: 'add party', subject };
  await recordChange({ ...change, after: { interests: held.length } }, transaction);
  return party;
}

/** Adds a party: who they are, how they are reached, and what they have to do with which buildings. */
export async function addParty(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  values: PartyValues,
): Promise<FoundParty> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    return insertParty(database, by, scheme, values, transaction);
  });
}
