import { subjectOf, tradeOf, type Job, type Trade } from './job.ts';

/** Work that goes on beside requests: of a trade one job at a time for a scheme, few at a time in all. */
export type Jobs = {
  readonly start: (job: Job) => void;
  /** Stops what is done or is to be done of an import or a print; resolves when nothing is. */
  readonly stop: (subject: string) => Promise<void>;
  /** Resolves when there is nothing to do. */
  readonly idle: () => Promise<void>;
  /** Stops everything. */
  readonly close: () => Promise<void>;
};

type Running = {
  readonly job: Job;
  readonly stopping: AbortController;
  readonly ended: Promise<void>;
};

export type JobsSetting = {
  readonly run: (job: Job, signal: AbortSignal) => Promise<void>;
  /** Writes a failure down; what it gives is done next. */
  readonly onFailed: (job: Job, error: unknown) => Promise<Job | undefined>;
  /** Cleans up after every job, done or not. */
  readonly onEnded: (job: Job) => Promise<void>;
  readonly atOnce: Readonly<Record<Trade, number>>;
};

/** Whether a job's trade has room for it, and nothing of that trade is done for its scheme. */
function isFree(job: Job, running: ReadonlyMap<string, Running>, most: number): boolean {
  const others = [...running.values()].filter((one) => tradeOf(one.job) === tradeOf(job));
  return others.length < most && others.every((one) => one.job.schemeId !== job.schemeId);
}

/** A queue of jobs. */
export function createJobs({ run, onFailed, onEnded, atOnce }: JobsSetting): Jobs {
  let waiting: Job[] = [];
  const running = new Map<string, Running>();

  async function work(job: Job, signal: AbortSignal): Promise<void> {
    try {
      if (!signal.aborted) await run(job, signal);
    } catch (error) {
      // what was stopped on purpose has not failed
      const next = signal.aborted ? undefined : await onFailed(job, error);
      if (next !== undefined) waiting.push(next);
    } finally {
      await onEnded(job);
      running.delete(subjectOf(job));
      startNext();
    }
  }

  function startNext(): void {
    for (const job of waiting) {
      if (!isFree(job, running, atOnce[tradeOf(job)])) continue;
      waiting = waiting.filter((one) => one !== job);
      const stopping = new AbortController();
      // begins after it is entered, so that it can leave
      const ended = Promise.resolve().then(() => work(job, stopping.signal));
      running.set(subjectOf(job), { job, stopping, ended });
    }
  }

  async function drop(isDropped: (job: Job) => boolean): Promise<void> {
    const dropped = waiting.filter(isDropped);
    waiting = waiting.filter((job) => !isDropped(job));
    await Promise.all(dropped.map(onEnded));
  }

  async function stop(subject: string): Promise<void> {
    await drop((job) => subjectOf(job) === subject);
    const one = running.get(subject);
    one?.stopping.abort();
    await one?.ended;
  }

  async function idle(): Promise<void> {
    while (running.size > 0) await Promise.all([...running.values()].map(({ ended }) => ended));
  }

  return {
    start: (job) => {
      waiting.push(job);
      startNext();
    },
    stop,
    idle,
    close: async () => {
      await drop(() => true);
      await Promise.all([...running.keys()].map(stop));
    },
  };
}
