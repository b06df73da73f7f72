import { randomUUID } from 'node:crypto';
import { setTimeout as sleep } from 'node:timers/promises';
import { z } from 'zod';
import type { Boss } from '../jobs/open-boss.ts';
import { findWaitingMails, insertMails } from '../models/outbox-mails.ts';
import type { Outbox } from './outbox.ts';
import { sendWaiting, type Sending } from './send-waiting.ts';

/** As the migration made it. */
const QUEUE = 'outbox';

/** In seconds: how often is looked for mails. */
const LOOK_EVERY = 0.5;

/** So many are handed over at once. */
const WORKERS = 2;

const MINUTE_MS = 60_000;

const jobSchema = z.object({ mailId: z.uuid() });

/** Somebody waits for a letter of their account, which must not stand behind thousands to owners. */
const FIRST = 1;

type Due = { readonly id: string; readonly schemeId: string | null; readonly nextTryAt?: Date };

function jobsOf(mails: readonly Due[]) {
  return mails.map(({ id, schemeId, nextTryAt }) => ({
    name: QUEUE,
    data: { mailId: id },
    // one that waits is not called for twice
    singletonKey: id,
    ...(schemeId === null && { priority: FIRST }),
    ...(nextTryAt !== undefined && { startAfter: nextTryAt }),
  }));
}

/**
 * The outbox, worked over the queue of the database. Each worker keeps to its share of the mails that may go
 * out in a minute.
 */
export async function openOutbox(tools: Sending & { readonly queues: Boss }): Promise<Outbox> {
  const { database, env, logger } = tools;
  const { boss, insert } = tools.queues;
  const pause = (WORKERS * MINUTE_MS) / env.MAILS_PER_MINUTE;
  const workers: string[] = [];

  function wake(): void {
    for (const id of workers) boss.notifyWorker(id);
  }

  async function send(mailId: string): Promise<void> {
    const start = performance.now();
    const again = await sendWaiting(tools, mailId);
    if (again !== null) await boss.insert(jobsOf([{ id: mailId, ...again }]));
    await sleep(Math.max(0, pause - (performance.now() - start)));
  }

  for (let k = 0; k < WORKERS; k += 1) {
    const id = await boss.work(QUEUE, { pollingIntervalSeconds: LOOK_EVERY }, async ([job]) => {
      try {
        if (job !== undefined) await send(jobSchema.parse(job.data).mailId);
      } catch (error) {
        logger.error({ err: error }, 'a mail could not be worked at');
        throw error;
      } finally {
        wake();
      }
    });
    workers.push(id);
  }
  return {
    put: async (mails, transaction) => {
      const numbered = mails.map((mail) => ({ ...mail, id: randomUUID() }));
      await insertMails(database, numbered, transaction);
      await insert(jobsOf(numbered), transaction);
      transaction.afterCommit(wake);
    },
    recover: async () => {
      const waiting = await findWaitingMails(database);
      await boss.insert(jobsOf(waiting));
      return waiting.length;
    },
  };
}
