import { mkdir, readdir, rm } from 'node:fs/promises';
import path from 'node:path';
import { literal, Op } from 'sequelize';
import { RegisterImport } from '../models/register-import.ts';
import { deleteStagedRows } from '../models/staged-rows.ts';
import type { Services } from '../services.ts';
import { recordChange } from './record-change.ts';

const STOPPED = 'The server stopped while reading. Send the file again.';
const NOT_TAKEN =
  'The server stopped while taking the file over. Nothing was taken over: confirm it again.';
const ABANDONED =
  'Nobody confirmed it within 14 days, so its rows were dropped. Send the file again.';
const PATIENCE_MS = 14 * 24 * 60 * 60 * 1000;

/** As they are named when they are received; the folder may hold others' files. */
const UPLOAD = /^[0-9a-f]{32}$/;

async function removeUploads(folder: string): Promise<void> {
  await mkdir(folder, { recursive: true });
  const names = (await readdir(folder)).filter((name) => UPLOAD.test(name));
  for (const name of names) await rm(path.join(folder, name), { force: true });
}

/** Drops what was sent long ago and still asks: the rows of a town are many. */
async function dropAbandoned(database: Services['database']): Promise<void> {
  const sentBefore = { [Op.lt]: new Date(Date.now() - PATIENCE_MS) };
  const abandoned = await RegisterImport.findAll({ where: { state: 'asking', at: sentBefore } });
  for (const { id, schemeId } of abandoned) {
    await database.transaction(async (transaction) => {
      const dropped = { state: 'cancelled', fault: ABANDONED } as const;
      await RegisterImport.update(dropped, { where: { id }, transaction });
      const subject = { kind: 'import', id };
      const told = { before: { state: 'asking' }, after: { state: 'cancelled' } };
      await recordChange({ by: null, schemeId, action: 'cancel import', subject, ...told }, transaction); // prettier-ignore
    });
    await deleteStagedRows(database, id, { keepNoted: false });
  }
}

/**
 * Puts in order what a server that stopped left behind, before the first request: what was half read has
 * failed, what was being checked or taken over is checked again, for its rows are here, and what nobody
 * came back to is dropped.
 */
export async function recoverImports({
  database,
  env,
  jobs,
}: Pick<Services, 'database' | 'env' | 'jobs'>): Promise<void> {
  const reading = await RegisterImport.findAll({ where: { state: 'reading' } });
  for (const { id } of reading) await deleteStagedRows(database, id, { keepNoted: false });
  const failed = { state: 'failed', fault: STOPPED } as const;
  await RegisterImport.update(failed, { where: { state: 'reading' } });
  await removeUploads(env.UPLOADS_FOLDER);
  await RegisterImport.update({ file: null }, { where: { file: { [Op.ne]: null } } });
  await dropAbandoned(database);
  const again = { state: 'checking', fault: NOT_TAKEN, version: literal('version + 1') } as const;
  await RegisterImport.update(again, { where: { state: 'importing' } });
  for (const { id, schemeId } of await RegisterImport.findAll({ where: { state: 'checking' } })) {
    jobs.start({ kind: 'check', importId: id, schemeId });
  }
}
