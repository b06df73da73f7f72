import { randomUUID } from 'node:crypto';
import { rm } from 'node:fs/promises';
import type { Sequelize, Transaction } from 'sequelize';
import type { PartyColumns } from '../../shared/schemas/party-imports.ts';
import { AppError } from '../errors.ts';
import { findKnownParties } from '../models/known-parties.ts';
import {
  findPartyImports,
  findStagedTable,
  insertPartyImport,
  updatePartyImport,
  type FoundPartyImport,
} from '../models/party-imports.ts';
import type { Scheme } from '../models/scheme.ts';
import { planImport } from '../parties/plan-import.ts';
import type { StagedTable } from '../parties/read-party-row.ts';
import { guessPartyColumns, readTable } from '../parties/read-table.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/** An import of parties of a scheme; of another scheme it is not there. */
export async function readPartyImport(
  database: Sequelize,
  schemeId: string,
  id: string,
  transaction: Transaction | null = null,
): Promise<FoundPartyImport> {
  const [found] = await findPartyImports(database, schemeId, id, transaction);
  if (found === undefined) throw new AppError('not-found');
  return found;
}

/** The table of an import that has not ended, kept from others until the transaction ends. */
export async function takeStagedTable(
  database: Sequelize,
  schemeId: string,
  id: string,
  transaction: Transaction,
): Promise<StagedTable> {
  await readPartyImport(database, schemeId, id, transaction);
  const table = await findStagedTable(database, id, transaction);
  if (table === undefined) throw new AppError('conflict', 'This import has ended already.');
  return table;
}

async function check(
  database: Sequelize,
  schemeId: string,
  table: StagedTable,
  columns: PartyColumns,
  transaction: Transaction,
) {
  const known = await findKnownParties(database, schemeId, transaction);
  const { lines, counts } = await planImport(table, columns, known);
  return { columns, counts, kept: { table, report: lines } };
}

/** Takes a file of parties in and checks it. Nothing is written to the list of parties. */
export async function startPartyImport(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { file, fileName }: { readonly file: string; readonly fileName: string },
): Promise<FoundPartyImport> {
  const table = await readTable(file).finally(() => rm(file, { force: true }));
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const checked = await check(database, scheme.id, table, guessPartyColumns(table), transaction);
    const id = randomUUID();
    const told = { id, schemeId: scheme.id, by: by.id, fileName, ...checked };
    await insertPartyImport(database, told, transaction);
    const subject = { kind: 'party import', id };
    const change = { by, schemeId: scheme.id, action: 'check party import', subject };
    await recordChange({ ...change, after: { fileName, ...checked.counts } }, transaction);
    return readPartyImport(database, scheme.id, id, transaction);
  });
}

/** Checks an import again: by other columns, or because the register has changed meanwhile. */
export async function checkPartyImport(
  { database }: Pick<Services, 'database'>,
  scheme: Scheme,
  id: string,
  columns: PartyColumns,
): Promise<FoundPartyImport> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const table = await takeStagedTable(database, scheme.id, id, transaction);
    const strange = Object.values(columns).find((name) => !table.columns.includes(name));
    if (strange !== undefined) {
      const message = `The file has no column ${strange}.`;
      throw new AppError('invalid-input', undefined, [{ path: 'columns', message }]);
    }
    const checked = await check(database, scheme.id, table, columns, transaction);
    await updatePartyImport(database, id, checked, transaction);
    return readPartyImport(database, scheme.id, id, transaction);
  });
}
