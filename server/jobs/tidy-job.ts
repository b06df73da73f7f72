import { rm } from 'node:fs/promises';
import type { Sequelize } from 'sequelize';
import { unfinishedFile } from '../evidence/print-file.ts';
import { printsThatAreDone } from '../models/prints.ts';
import type { Job, PrintJob } from './job.ts';
import { removeReadFile } from './remove-file.ts';

/** A file may have been whole before its print was stopped or failed. */
async function removeUnlessDone(database: Sequelize, { printId, file }: PrintJob): Promise<void> {
  await rm(unfinishedFile(file), { force: true });
  const done = await printsThatAreDone(database, [printId]);
  if (done.length === 0) await rm(file, { force: true });
}

/** Removes what a job has left behind, done or not. */
export async function tidyJob(database: Sequelize, job: Job): Promise<void> {
  if (job.kind === 'print') await removeUnlessDone(database, job);
  else await removeReadFile(job);
}
