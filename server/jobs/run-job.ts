import { checkImport } from './check-import.ts';
import type { Job, JobTools } from './job.ts';
import { printSheets } from './print-sheets.ts';
import { readImport } from './read-import.ts';
import { takeOverImport } from './take-over-import.ts';

/** Does a job; a file that was read is checked at once. */
export async function runJob(tools: JobTools, job: Job): Promise<void> {
  if (job.kind === 'print') {
    await printSheets(tools, job);
    return;
  }
  if (job.kind === 'take over') {
    await takeOverImport(tools, job);
    return;
  }
  if (job.kind === 'read') {
    await readImport(tools, job);
    tools.onChecking();
  }
  await checkImport(tools, job.importId);
}
