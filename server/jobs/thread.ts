import { parentPort, workerData } from 'node:worker_threads';
import { z } from 'zod';
import { connectDatabase } from '../database/connect.ts';
import { AppError } from '../errors.ts';
import type { Job } from './job.ts';
import { runJob } from './run-job.ts';
import type { ThreadMessage } from './thread-messages.ts';

const given = z.object({ job: z.custom<Job>(), databaseUrl: z.string() }).parse(workerData);

function tell(message: ThreadMessage): void {
  parentPort?.postMessage(message);
}

function tellFault(error: unknown): void {
  if (error instanceof AppError) {
    const message = error.fields[0]?.message ?? error.message;
    tell({ kind: 'refused', code: error.code, message });
  } else {
    tell({ kind: 'failed', stack: error instanceof Error ? (error.stack ?? '') : String(error) });
  }
}

/** Does one job with a connection of its own, and ends. */
async function work(): Promise<void> {
  const database = connectDatabase(given.databaseUrl);
  try {
    // ended from without: nobody aborts it from within
    const { signal } = new AbortController();
    const onChecking = () => {
      tell({ kind: 'checking' });
    };
    await runJob({ database, signal, onChecking }, given.job);
    tell({ kind: 'done' });
  } catch (error) {
    tellFault(error);
  } finally {
    await database.close();
  }
}

await work();
