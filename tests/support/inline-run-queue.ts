import type { Sequelize } from 'sequelize';
import type { Asked, Computed } from '../../server/runs/compute.ts';
import { doStep, failRun } from '../../server/runs/do-step.ts';
import type { RunQueue } from '../../server/runs/run-queue.ts';
import type { RunStep } from '../../server/runs/run-step.ts';
import { computedOnce } from './computed-once.ts';

export type InlineRunQueue = RunQueue & {
  /** Resolves when there is nothing to do. */
  readonly idle: () => Promise<void>;
  /** Keeps steps waiting until it is called with false. */
  readonly hold: (isHeld: boolean) => void;
};

/** Steps done one after the other in this very thread as soon as they are sent. */
export function inlineRunQueue(database: Sequelize): InlineRunQueue {
  const waiting: RunStep[] = [];
  let working: Promise<void> = Promise.resolve();
  let isHeld = false;
  const threads = {
    compute: <A extends Asked>(asked: A): Promise<Computed<A>> =>
      Promise.resolve().then(() => computedOnce(asked)),
  };

  async function workAll(): Promise<void> {
    for (;;) {
      const step = isHeld ? undefined : waiting.shift();
      if (step === undefined) return;
      try {
        await doStep({ database, threads, queue }, step);
      } catch (error) {
        await failRun(database, step.runId, error instanceof Error ? error.message : 'unknown');
      }
    }
  }

  function startWork(): void {
    working = working.then(workAll);
  }

  const queue: RunQueue = {
    send: (steps, transaction) => {
      transaction.afterCommit(() => {
        waiting.push(...steps);
        startWork();
      });
      return Promise.resolve();
    },
    compute: threads.compute,
    close: async () => {
      waiting.length = 0;
      await working;
    },
  };
  return {
    ...queue,
    idle: async () => {
      let seen;
      do {
        seen = working;
        await seen;
      } while (seen !== working);
    },
    hold: (next) => {
      isHeld = next;
      if (!next) startWork();
    },
  };
}
