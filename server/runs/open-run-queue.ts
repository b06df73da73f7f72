import type PgBoss from 'pg-boss';
import type { Boss } from '../jobs/open-boss.ts';
import type { Services } from '../services.ts';
import { doStep, failRun, type StepTools } from './do-step.ts';
import type { RunQueue } from './run-queue.ts';
import { runStepSchema, type RunStep } from './run-step.ts';
import { openRunThreads } from './run-threads.ts';

/** As the migration made it. */
const QUEUE = 'run-steps';

/** In seconds: how often is looked for steps. */
const LOOK_EVERY = 0.5;

/** A step that fails so often will not do better, whereas one whose process was killed has not failed. */
const TRIES = 3;

type Tools = Pick<Services, 'database' | 'logger'> & { readonly queues: Boss };

/** Does steps, and ends a run of which one fails again and again; a step that was killed has not failed. */
function stepWorker({ database, logger }: Tools, step: Omit<StepTools, 'database'>) {
  const failures = new Map<string, number>();

  async function fail(failed: RunStep, id: string, error: unknown): Promise<void> {
    const count = (failures.get(id) ?? 0) + 1;
    failures.set(id, count);
    logger.error({ err: error, step: failed }, 'a step of a run failed');
    if (count < TRIES) throw error;
    failures.delete(id);
    const why = error instanceof Error ? error.message : String(error);
    await failRun(database, failed.runId, why);
  }

  return async ({ id, data }: PgBoss.Job): Promise<void> => {
    const asked = runStepSchema.parse(data);
    try {
      await doStep({ database, ...step }, asked);
      failures.delete(id);
    } catch (error) {
      await fail(asked, id, error);
    }
  };
}

/**
 * The queue of the database, worked by as many at once as there are threads. Other processes may work it
 * too; a step that one of them was killed over comes back to it.
 */
export async function openRunQueue(tools: Tools): Promise<RunQueue> {
  const { boss, insert } = tools.queues;
  const threads = openRunThreads();
  const workers: string[] = [];

  function wake(): void {
    for (const id of workers) boss.notifyWorker(id);
  }

  const queue: RunQueue = {
    send: async (steps, transaction) => {
      await insert(
        steps.map((data) => ({ name: QUEUE, data })),
        transaction,
      );
      transaction.afterCommit(wake);
    },
    compute: threads.compute,
    close: threads.close,
  };

  const work = stepWorker(tools, { threads, queue });
  const options = { pollingIntervalSeconds: LOOK_EVERY };
  for (let k = 0; k < threads.size; k += 1) {
    const id = await boss.work(QUEUE, options, async ([job]: readonly PgBoss.Job[]) => {
      if (job !== undefined) await work(job);
      // there is likely more where this came from
      wake();
    });
    workers.push(id);
  }
  return queue;
}
