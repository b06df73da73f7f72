import type { Sequelize, Transaction } from 'sequelize';
import { findMergedInto, type FoundParty } from '../models/parties.ts';
import { heldSettings } from '../models/letter-settings.ts';
import { endMailsOfParties } from '../models/outbox-mails.ts';
import { insertPartyChanges } from '../models/party-changes.ts';
import { giveUpOpenImports } from '../models/party-imports.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { readParty, takeParty } from './kept-party.ts';
import { recordChange } from './record-change.ts';
import { releasePeople } from './release-person.ts';

type Erasure = {
  readonly id: string;
  readonly version: number;
  readonly ground: string;
  readonly askedOn: string;
};

async function clear(
  database: Sequelize,
  ids: readonly string[],
  transaction: Transaction,
): Promise<void> {
  const options = { bind: [ids], transaction };
  await database.query('delete from interests where party_id = any($1::uuid[])', options);
  await database.query(
    `update parties set represented_by = null, version = version + 1
     where represented_by = any($1::uuid[])`,
    options,
  );
  await database.query(
    `update party_changes set before = null, after = null where party_id = any($1::uuid[])`,
    options,
  );
  await database.query(
    `update parties set name = '', address = '', email = null, channel = 'post', represented_by = null,
       version = version + 1, changed_at = now(), erased_at = now() where id = any($1::uuid[])`,
    options,
  );
}

/**
 * What names them beside their own record: mails that wait do not go out, days that they asked for are
 * forgotten, and an import whose file may name them is given up.
 */
async function clearBeside(
  database: Sequelize,
  schemeId: string,
  ids: readonly string[],
  transaction: Transaction,
): Promise<{ readonly mailsHeldBack: number; readonly importsGivenUp: number }> {
  await database.query(
    `update appointments set asked_for = null, version = version + 1, changed_at = now(),
       state = case state when 'another day asked for' then 'cancelled' else state end
     where party_id = any($1::uuid[]) and asked_for is not null`,
    { bind: [ids], transaction },
  );
  return {
    mailsHeldBack: await endMailsOfParties(database, ids, transaction),
    importsGivenUp: await giveUpOpenImports(database, schemeId, transaction),
  };
}

/**
 * Erases what is known of a party and of those merged into it. That it was done stays, with its ground;
 * the trail stays too, and letters and what was written until the day that the scheme states. An archived
 * scheme does not stand in the way.
 */
export async function eraseParty(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { ground, askedOn, ...seen }: Erasure,
): Promise<FoundParty> {
  return database.transaction(async (transaction) => {
    await scheme.reload({ transaction, lock: transaction.LOCK.UPDATE });
    await takeParty(database, scheme.id, seen, transaction);
    const ids = [seen.id, ...(await findMergedInto(database, seen.id, transaction))];
    const noOwners = await releasePeople(database, scheme.id, ids, transaction);
    await clear(database, ids, transaction);
    const beside = await clearBeside(database, scheme.id, ids, transaction);
    const { settings } = await heldSettings(database, scheme, transaction);
    await database.query(
      `insert into party_erasures (party_id, ground, asked_on, erased_by, keep_until)
       select id, $2, $3::date, $4, current_date + make_interval(years => $5)
       from unnest($1::uuid[]) as id`,
      { bind: [ids, ground, askedOn, by.id, settings.keepYears], transaction },
    );
    const history = { partyId: seen.id, action: 'erased', before: null, after: null } as const;
    await insertPartyChanges(database, by.id, [history], transaction);
    const subject = { kind: 'party', id: seen.id };
    const change = { by, schemeId: scheme.id, action: 'erase personal data', subject };
    await recordChange({ ...change, after: { ground, askedOn, noOwners, ...beside } }, transaction);
    return readParty(database, scheme.id, seen.id, transaction);
  });
}
