import type { Case, Worked } from './preview-work.ts';

/** What is asked of a worker; tests give one that only notes it. */
export type WorkerPort = Pick<Worker, 'postMessage' | 'terminate'> & {
  readonly addEventListener: (
    type: 'message',
    listener: (event: MessageEvent<Worked>) => void,
  ) => void;
};

/** Asks a worker one thing at a time: while it is busy, only the newest question waits. */
export function createLatestAsked(worker: WorkerPort, onWorked: (worked: Worked) => void) {
  let isBusy = false;
  let waiting: Case | null = null;

  function send(asked: Case): void {
    isBusy = true;
    worker.postMessage(asked);
  }
  worker.addEventListener('message', ({ data }) => {
    isBusy = false;
    if (waiting !== null) send(waiting);
    waiting = null;
    onWorked(data);
  });
  return {
    ask: (asked: Case) => {
      if (isBusy) waiting = asked;
      else send(asked);
    },
    end: () => {
      worker.terminate();
    },
  };
}
