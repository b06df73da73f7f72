import type { Transaction } from 'sequelize';
import type { RunStep } from './run-step.ts';
import type { RunThreads } from './run-threads.ts';

/** Where steps of runs wait to be done, by this process or another. */
export type RunQueue = {
  /** Puts steps into the queue when the transaction that calls for them is committed, or not at all. */
  readonly send: (steps: readonly RunStep[], transaction: Transaction) => Promise<void>;
  /** Arithmetic that a request waits for, beside that of runs. */
  readonly compute: RunThreads['compute'];
  /** Ends the threads, once the queues have stopped. */
  readonly close: () => Promise<void>;
};
