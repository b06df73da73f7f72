import type { OpenedSamples } from '../../../../shared/assessment/opened-samples.ts';
import type { SamplesAsked } from './work-samples.ts';

type Answers = {
  readonly onDrawn: (samples: OpenedSamples | null) => void;
  readonly onFault: () => void;
};

/** Draws samples in a thread of their own, so that the page stays quick; gives back how to give them up. */
export function drawInThread(asked: SamplesAsked, { onDrawn, onFault }: Answers): () => void {
  const worker = new Worker(new URL('./samples-worker.ts', import.meta.url), { type: 'module' });
  worker.addEventListener('message', ({ data }: MessageEvent<OpenedSamples | null>) => {
    worker.terminate();
    onDrawn(data);
  });
  worker.addEventListener('error', () => {
    worker.terminate();
    onFault();
  });
  worker.postMessage(asked);
  return () => {
    worker.terminate();
  };
}
