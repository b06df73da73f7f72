import type { Services } from '../services.ts';
import { failJob } from './fail-job.ts';
import { createJobs, type Jobs } from './jobs.ts';
import { runInThread } from './run-in-thread.ts';
import { runJob } from './run-job.ts';
import { tidyJob } from './tidy-job.ts';

type Tools = Pick<Services, 'env' | 'database' | 'logger'>;

const AT_ONCE = { import: 2, print: 1 };

/** Jobs in threads of their own, so that requests are answered meanwhile. */
export function openJobs(tools: Tools): Jobs {
  return createJobs({
    run: (job, signal) => runInThread(tools.env.DATABASE_URL, job, signal),
    onFailed: (job, error) => failJob(tools, job, error),
    onEnded: (job) => tidyJob(tools.database, job),
    atOnce: AT_ONCE,
  });
}

/** Jobs beside requests in the same thread, which start at once: for tests. */
export function openJobsInline(tools: Tools): Jobs {
  const { database } = tools;
  return createJobs({
    run: (job, signal) => runJob({ database, signal, onChecking: () => undefined }, job),
    onFailed: (job, error) => failJob(tools, job, error),
    onEnded: (job) => tidyJob(tools.database, job),
    atOnce: AT_ONCE,
  });
}
