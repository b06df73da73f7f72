import { mkdir, readdir, rm } from 'node:fs/promises';
import path from 'node:path';
import { printFile, unfinishedFile } from '../evidence/print-file.ts';
import { putPrintsBack } from '../models/prints.ts';
import type { Services } from '../services.ts';

/**
 * Draws anew what a server that stopped had not finished, at start: what waited and what was half drawn.
 * Halves of files go.
 */
export async function recoverPrints({
  database,
  env,
  jobs,
}: Pick<Services, 'database' | 'env' | 'jobs'>): Promise<void> {
  const folder = env.PRINTS_FOLDER;
  await mkdir(folder, { recursive: true, mode: 0o700 });
  const halves = (await readdir(folder)).filter((name) => name.endsWith(unfinishedFile('.pdf')));
  for (const name of halves) await rm(path.join(folder, name), { force: true });
  for (const { id, schemeId } of await putPrintsBack(database)) {
    jobs.start({ kind: 'print', printId: id, schemeId, file: printFile(env, id) });
  }
}
