import type { Sequelize, Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import type { FoundParty } from '../models/parties.ts';
import { insertPartyChanges } from '../models/party-changes.ts';
import type { Scheme } from '../models/scheme.ts';
import { lockParties } from '../models/write-parties.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readParty, takeParty, toldOfParty } from './kept-party.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';
import { releasePeople } from './release-person.ts';

type Seen = { readonly id: string; readonly version: number };

/** Hands over what the one that goes holds and the one that stays lacks. Who is no owner any more. */
async function handOver(
  database: Sequelize,
  schemeId: string,
  { stays, goes }: { readonly stays: FoundParty; readonly goes: FoundParty },
  transaction: Transaction,
): Promise<string[]> {
  const bind = [stays.id, goes.id];
  const options = { bind, transaction };
  await database.query(
    `update interests i set party_id = $1 where party_id = $2 and not exists (
       select from interests k where k.party_id = $1 and k.building_id = i.building_id
         and k.kind = i.kind and (k.from_day, k.to_day) is not distinct from (i.from_day, i.to_day))`,
    options,
  );
  await database.query('delete from interests where party_id = $1', {
    bind: [goes.id],
    transaction,
  });
  await database.query(
    `update parties set represented_by = nullif($1::uuid, id), version = version + 1
     where represented_by = $2`,
    options,
  );
  if (stays.person === null) {
    await database.query(
      `update parties set person_id = (select person_id from parties where id = $2) where id = $1`,
      options,
    );
  }
  const noOwners = await releasePeople(database, schemeId, [goes.id], transaction);
  await database.query(
    `update parties set merged_into = $1, represented_by = null, version = version + 1,
       changed_at = now() where id = $2`,
    options,
  );
  await database.query(
    `update parties set version = version + 1, changed_at = now(),
       represented_by = nullif(represented_by, $2) where id = $1`,
    options,
  );
  return noOwners;
}

/** Makes one of two parties; the other stays as a pointer to it, and what names it is read through that. */
export async function mergeParties(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { stays, goes }: { readonly stays: Seen; readonly goes: Seen },
): Promise<FoundParty> {
  if (stays.id === goes.id) {
    const message = 'Choose another party to merge it with.';
    throw new AppError('invalid-input', undefined, [{ path: 'other.id', message }]);
  }
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    await lockParties(database, scheme.id, [stays.id, goes.id], transaction);
    const both = {
      stays: await takeParty(database, scheme.id, stays, transaction),
      goes: await takeParty(database, scheme.id, goes, transaction),
    };
    const noOwners = await handOver(database, scheme.id, both, transaction);
    const party = await readParty(database, scheme.id, stays.id, transaction);
    const action = 'merged';
    const changes = [
      { partyId: stays.id, action, before: toldOfParty(both.stays), after: toldOfParty(party) },
      { partyId: goes.id, action, before: toldOfParty(both.goes), after: null },
    ] as const;
    await insertPartyChanges(database, by.id, changes, transaction);
    const subject = { kind: 'party', id: stays.id };
    const change = { by, schemeId: scheme.id, action: 'merge parties', subject };
    await recordChange({ ...change, after: { merged: goes.id, noOwners } }, transaction);
    return party;
  });
}
