import { rm } from 'node:fs/promises';
import { RegisterImport } from '../models/register-import.ts';
import type { ImportJob } from './job.ts';

/** Removes the file of an import that was kept so that another of its layers could be chosen. */
export async function removeKeptFile({ id, file }: RegisterImport): Promise<void> {
  if (file === null) return;
  await rm(file, { force: true });
  await RegisterImport.update({ file: null }, { where: { id } });
}

/** Removes the file that a job has read, unless its import was read and keeps it. */
export async function removeReadFile(job: ImportJob): Promise<void> {
  if (job.kind !== 'read') return;
  const { importId: id, file } = job;
  const kept = await RegisterImport.count({ where: { id, file, state: ['checking', 'asking'] } });
  if (kept === 0) await rm(file, { force: true });
}
