import { rm } from 'node:fs/promises';
import { unfinishedFile } from '../evidence/print-file.ts';
import type { Job } from './job.ts';
import { removeReadFile } from './remove-file.ts';

/** Removes what a job has left behind, done or not. */
export async function tidyJob(job: Job): Promise<void> {
  if (job.kind === 'print') await rm(unfinishedFile(job.file), { force: true });
  else await removeReadFile(job);
}
