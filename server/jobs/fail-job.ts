import { literal } from 'sequelize';
import { AppError } from '../errors.ts';
import { failPrint } from '../models/prints.ts';
import { RegisterImport } from '../models/register-import.ts';
import { deleteStagedRows } from '../models/staged-rows.ts';
import type { Services } from '../services.ts';
import { subjectOf, type ImportJob, type Job } from './job.ts';
import { removeKeptFile } from './remove-file.ts';

/** What people read of a fault: our own words, never a program's. */
function wordsOf(error: unknown): string {
  if (!(error instanceof AppError)) return new AppError('internal').message;
  const [field] = error.fields;
  return field?.message ?? error.message;
}

async function forget(database: Services['database'], importId: string): Promise<void> {
  await deleteStagedRows(database, importId, { keepNoted: false });
  const row = await RegisterImport.findByPk(importId);
  if (row !== null) await removeKeptFile(row);
}

/**
 * What was not taken over goes back to being checked, so that the person sees the register as it is now
 * and may confirm again; the next job is returned.
 */
async function failImport(
  database: Services['database'],
  job: ImportJob,
  error: unknown,
): Promise<Job | undefined> {
  const { importId, schemeId } = job;
  if (job.kind === 'take over') {
    const fault = `${wordsOf(error)} Nothing was taken over. The file was checked again: look at it and confirm once more.`;
    const version = literal('version + 1');
    const back = { state: 'checking', fault, done: 0, version } as const;
    const [found] = await RegisterImport.update(back, { where: { id: importId, state: 'importing' } }); // prettier-ignore
    return found === 1 ? { kind: 'check', importId, schemeId } : undefined;
  }
  const failed = { state: 'failed', fault: wordsOf(error) } as const;
  const where = { id: importId, state: ['reading', 'checking'] };
  const [found] = await RegisterImport.update(failed, { where });
  if (found === 1) await forget(database, importId);
  return undefined;
}

/** Writes down that a job failed; what is to be done next is returned. */
export async function failJob(
  { database, logger }: Pick<Services, 'database' | 'logger'>,
  job: Job,
  error: unknown,
): Promise<Job | undefined> {
  if (!(error instanceof AppError)) {
    logger.error({ err: error, subject: subjectOf(job) }, `a job failed: ${job.kind}`);
  }
  if (job.kind !== 'print') return failImport(database, job, error);
  await failPrint(database, job.printId, wordsOf(error));
  return undefined;
}
