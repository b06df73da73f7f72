import type { WorkerPort } from './latest-asked.ts';

/** Settlement is worked out in a thread of its own, so that the page stays quick. */
export function openPreviewWorker(): WorkerPort {
  return new Worker(new URL('./preview-worker.ts', import.meta.url), { type: 'module' });
}
