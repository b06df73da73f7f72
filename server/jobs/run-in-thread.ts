import { Worker } from 'node:worker_threads';
import { AppError } from '../errors.ts';
import { tradeOf, type Job } from './job.ts';
import { threadMessageSchema } from './thread-messages.ts';

/** How long a thread may take, in milliseconds, and what people read when it takes longer. */
const PATIENCE = {
  read: [120_000, 'Reading the file took more than two minutes. Send it in smaller parts.'],
  check: [300_000, 'Checking the file took more than five minutes. Send it in smaller parts.'],
  'take over': [300_000, 'Taking the file over took more than five minutes. Send it in smaller parts.'],
  print: [900_000, 'Printing took more than a quarter of an hour. Print fewer sheets at a time.'],
} as const; // prettier-ignore

const MOST_MEGABYTES = 700;
const NO_MEMORY = {
  import: 'The file needs more memory than there is for one. Send it in smaller parts.',
  print: 'The print needs more memory than there is for one. Print fewer sheets at a time.',
} as const;

/** Beside the sources while they are read as they are, beside the built server otherwise. */
function entry(): URL {
  const isSource = import.meta.url.endsWith('.ts');
  return new URL(isSource ? './from-source.mjs' : './jobs/thread.mjs', import.meta.url);
}

function isOutOfMemory(error: unknown): boolean {
  return error instanceof Error && 'code' in error && error.code === 'ERR_WORKER_OUT_OF_MEMORY';
}

function fault(message: unknown): Error | undefined {
  const told = threadMessageSchema.parse(message);
  if (told.kind === 'refused') return new AppError(told.code, told.message);
  return told.kind === 'failed' ? new Error(told.stack) : undefined;
}

/** Does a job in a thread of its own, with bounded memory and time; stopping it ends the thread. */
export function runInThread(databaseUrl: string, job: Job, signal: AbortSignal): Promise<void> {
  const worker = new Worker(entry(), {
    workerData: { job, databaseUrl },
    resourceLimits: {
      maxOldGenerationSizeMb: MOST_MEGABYTES,
      // rows come and go: a small nursery would be swept over and over
      maxYoungGenerationSizeMb: 64,
    },
    execArgv: [],
  });
  return new Promise((resolve, reject) => {
    let found: Error | undefined;
    let patience: NodeJS.Timeout | undefined;
    function end(error?: Error): void {
      found ??= error;
      void worker.terminate();
    }
    function waitFor(kind: Job['kind']): void {
      clearTimeout(patience);
      const [milliseconds, words] = PATIENCE[kind];
      patience = setTimeout(() => { end(new AppError('too-large', words)); }, milliseconds); // prettier-ignore
    }
    waitFor(job.kind);
    signal.addEventListener('abort', () => { end(new Error('The job was stopped.')); }, { once: true }); // prettier-ignore
    worker.on('message', (message: unknown) => {
      found ??= fault(message);
      if (threadMessageSchema.parse(message).kind === 'checking') waitFor('check');
    });
    worker.on('error', (error) => {
      found ??= isOutOfMemory(error)
        ? new AppError('too-large', NO_MEMORY[tradeOf(job)])
        : asError(error);
    });
    worker.on('exit', (code) => {
      clearTimeout(patience);
      if (found === undefined && code !== 0) found = new Error(`The thread ended with ${code}.`);
      if (found === undefined) resolve();
      else reject(found);
    });
  });
}

function asError(error: unknown): Error {
  return error instanceof Error ? error : new Error(String(error));
}
