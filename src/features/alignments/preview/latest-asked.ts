import type { Asked, Worked } from './preview-work.ts';

/** What a worker is asked of; tests give one that only notes it. */
export type WorkerPort = Pick<Worker, 'postMessage' | 'terminate' | 'addEventListener'>;

/**
 * Asks a worker one thing at a time: while it is busy only the newest question waits, and an answer comes
 * with its question.
 */
export function createLatestAsked(
  worker: WorkerPort,
  onWorked: (worked: Worked, asked: Asked) => void,
) {
  let [busyWith, waiting]: [Asked | null, Asked | null] = [null, null];

  function send(asked: Asked): void {
    busyWith = asked;
    worker.postMessage(asked);
  }
  worker.addEventListener('message', (event) => {
    if (!(event instanceof MessageEvent) || busyWith === null) return;
    const asked = busyWith;
    busyWith = null;
    if (waiting !== null) send(waiting);
    waiting = null;
    const worked: Worked = event.data;
    onWorked(worked, asked);
  });
  return {
    ask: (asked: Asked) => {
      if (busyWith === null) send(asked);
      else waiting = asked;
    },
    end: () => {
      worker.terminate();
    },
  };
}
