import type { ChecksDone } from './run-checks.ts';

type Answers = {
  readonly onDone: (done: ChecksDone) => void;
  readonly onFault: () => void;
};

/** Runs all checks in a thread of their own; gives back how to give them up. */
export function runChecksInThread({ onDone, onFault }: Answers): () => void {
  const worker = new Worker(new URL('./checks-worker.ts', import.meta.url), { type: 'module' });
  worker.addEventListener('message', ({ data }: MessageEvent<ChecksDone>) => {
    worker.terminate();
    onDone(data);
  });
  worker.addEventListener('error', () => {
    worker.terminate();
    onFault();
  });
  worker.postMessage('run');
  return () => {
    worker.terminate();
  };
}
