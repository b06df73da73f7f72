import { mkdir, readdir, rm } from 'node:fs/promises';
import path from 'node:path';
import type { Sequelize } from 'sequelize';
import { printFile, printOfFile, unfinishedFile } from '../evidence/print-file.ts';
import { printsThatAreDone, putPrintsBack } from '../models/prints.ts';
import type { Services } from '../services.ts';

/** Removes halves of files, and whole ones whose print was stopped or failed before that was written down. */
async function removeLeftFiles(database: Sequelize, folder: string): Promise<void> {
  const names = await readdir(folder);
  const prints = names.flatMap((name) => printOfFile(name) ?? []);
  const done = new Set(await printsThatAreDone(database, prints));
  const left = names.filter((name) => {
    const print = printOfFile(name);
    return print === undefined ? name.endsWith(unfinishedFile('.pdf')) : !done.has(print);
  });
  for (const name of left) await rm(path.join(folder, name), { force: true });
}

/** Draws anew what a server that stopped had not finished, at start: what waited and what was half drawn. */
export async function recoverPrints({
  database,
  env,
  jobs,
}: Pick<Services, 'database' | 'env' | 'jobs'>): Promise<void> {
  const folder = env.PRINTS_FOLDER;
  await mkdir(folder, { recursive: true, mode: 0o700 });
  await removeLeftFiles(database, folder);
  for (const { id, schemeId } of await putPrintsBack(database)) {
    jobs.start({ kind: 'print', printId: id, schemeId, file: printFile(env, id) });
  }
}
