import type { Sequelize, Transaction } from 'sequelize';
import type { PartyImportCounts } from '../../shared/schemas/party-imports.ts';
import { AppError } from '../errors.ts';
import { findKnownParties } from '../models/known-parties.ts';
import { findPartiesById } from '../models/parties.ts';
import { insertPartyChanges, type PartyChange } from '../models/party-changes.ts';
import { endPartyImport, type FoundPartyImport } from '../models/party-imports.ts';
import type { Scheme } from '../models/scheme.ts';
import { completeParties, insertInterests, insertParties } from '../models/write-parties.ts';
import { planImport, type PartyPlan } from '../parties/plan-import.ts';
import type { Actor } from '../policies/actor.ts';
import { inBatches } from '../register/in-batches.ts';
import type { Services } from '../services.ts';
import { readPartyImport, takeStagedTable } from './check-party-import.ts';
import { toldOfParty } from './kept-party.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

function requireSeen(counts: PartyImportCounts, seen: PartyImportCounts): void {
  const isSame = Object.entries(counts).every(
    ([name, count]) => Object.entries(seen).find(([other]) => other === name)?.[1] === count,
  );
  if (isSame) return;
  throw new AppError(
    'conflict',
    'The register or the list of parties has changed since this was checked, so it would come out differently. Nothing was taken over. Check it again.',
  );
}

async function write(
  database: Sequelize,
  schemeId: string,
  { added, interests, completed }: PartyPlan,
  transaction: Transaction,
): Promise<void> {
  for await (const some of inBatches(added)) {
    await insertParties(database, schemeId, some, transaction);
  }
  for await (const some of inBatches(completed)) {
    await completeParties(database, some, transaction);
  }
  for await (const some of inBatches(interests)) {
    await insertInterests(database, some, transaction);
  }
}

/** What parties are now, told for their histories. */
async function toldOf(
  database: Sequelize,
  schemeId: string,
  ids: readonly string[],
  transaction: Transaction,
): Promise<Map<string, object>> {
  const told = new Map<string, object>();
  for await (const some of inBatches(ids)) {
    const parties = await findPartiesById(database, schemeId, some, transaction);
    for (const party of parties) told.set(party.id, toldOfParty(party));
  }
  return told;
}

/** Takes over what an import was checked to come to, all of it or nothing. */
export async function takeOverPartyImport(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { id, counts: seen }: { readonly id: string; readonly counts: PartyImportCounts },
): Promise<FoundPartyImport> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const table = await takeStagedTable(database, scheme.id, id, transaction);
    const { columns } = await readPartyImport(database, scheme.id, id, transaction);
    const known = await findKnownParties(database, scheme.id, transaction);
    const plan = await planImport(table, columns, known);
    requireSeen(plan.counts, seen);
    const old = plan.completed.map((one) => one.id);
    const before = await toldOf(database, scheme.id, old, transaction);
    await write(database, scheme.id, plan, transaction);
    const all = [...old, ...plan.added.map((one) => one.id)];
    const after = await toldOf(database, scheme.id, all, transaction);
    const changes = all.map((partyId): PartyChange => {
      const states = { before: before.get(partyId) ?? null, after: after.get(partyId) ?? null };
      return { partyId, action: 'imported', ...states };
    });
    for await (const some of inBatches(changes)) {
      await insertPartyChanges(database, by.id, some, transaction);
    }
    await endPartyImport(database, id, plan.lines, transaction);
    const subject = { kind: 'party import', id };
    const change = { by, schemeId: scheme.id, action: 'take over party import', subject };
    await recordChange({ ...change, after: plan.counts }, transaction);
    return readPartyImport(database, scheme.id, id, transaction);
  });
}
