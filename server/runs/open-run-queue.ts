import PgBoss from 'pg-boss';
import type { Transaction } from 'sequelize';
import { z } from 'zod';
import type { Services } from '../services.ts';
import { doStep, failRun, type StepTools } from './do-step.ts';
import type { RunQueue } from './run-queue.ts';
import { runStepSchema, type RunStep } from './run-step.ts';
import { openRunThreads } from './run-threads.ts';

/** As the migration made it. */
const QUEUE = 'run-steps';

/** In seconds: how often is looked for steps, and for steps whose process died. */
const LOOK_EVERY = 0.5;
const TIDY_EVERY = 5;

/** A step that fails so often will not do better, whereas one whose process was killed has not failed. */
const TRIES = 3;

const STOP_WITHIN_MS = 5000;

type Tools = Pick<Services, 'database' | 'logger'> & {
  readonly env: Pick<Services['env'], 'DATABASE_URL'>;
};

/** The queue's statements in a transaction of the application's. */
function within({ database }: Tools, transaction: Transaction): PgBoss.Db {
  return {
    executeSql: async (text: string, values: unknown[]) => {
      // what is left out is null in SQL, and nothing at all to the binder
      const bind = values.map((value) => value ?? null);
      const [rows] = await database.query(text, { bind, transaction });
      return { rows: z.array(z.unknown()).parse(rows) };
    },
  };
}

/** Does steps, and ends a run of which one fails again and again; a step that was killed has not failed. */
function stepWorker(tools: Tools, step: Omit<StepTools, 'database'>) {
  const { database, logger } = tools;
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

/** The queue as it lies in the database; nothing is made in it here. */
function openBoss({ env, logger }: Tools): PgBoss {
  const boss = new PgBoss({
    connectionString: env.DATABASE_URL,
    application_name: 'groundsill runs',
    max: 4,
    migrate: false,
    schedule: false,
    maintenanceIntervalSeconds: TIDY_EVERY,
  });
  boss.on('error', (error) => {
    logger.error({ err: error }, 'the queue of runs');
  });
  return boss;
}

/**
 * The queue of the database, worked by as many at once as there are threads. Other processes may work it
 * too; a step that one of them was killed over comes back to it.
 */
export async function openRunQueue(tools: Tools): Promise<RunQueue> {
  const boss = openBoss(tools);
  await boss.start();
  const threads = openRunThreads();
  const workers: string[] = [];

  function wake(): void {
    for (const id of workers) boss.notifyWorker(id);
  }

  const queue: RunQueue = {
    send: async (steps, transaction) => {
      const jobs = steps.map((data) => ({ name: QUEUE, data }));
      await boss.insert(jobs, { db: within(tools, transaction) });
      transaction.afterCommit(wake);
    },
    compute: threads.compute,
    close: async () => {
      await boss.stop({ timeout: STOP_WITHIN_MS });
      await threads.close();
    },
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
