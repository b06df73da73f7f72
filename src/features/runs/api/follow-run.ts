import { runProgressSchema, type RunProgress } from '../../../../shared/schemas/runs.ts';
import { apiPath } from '../../../lib/api-path.ts';
import { isActive } from '../run-states.ts';

type Listener = {
  readonly onProgress: (progress: RunProgress) => void;
  /** Nothing more is told, though the run goes on. */
  readonly onBroken: () => void;
};

function progressOf(event: MessageEvent<unknown>): RunProgress | null {
  if (typeof event.data !== 'string') return null;
  try {
    return runProgressSchema.safeParse(JSON.parse(event.data)).data ?? null;
  } catch {
    return null;
  }
}

/**
 * Listens to how far a run is until it has ended; what it returns stops listening. A stream that ends early
 * is opened once more by the browser, as the server ends each after some minutes.
 */
export function followRun(schemeId: string, runId: string, listener: Listener): () => void {
  const path = apiPath`/api/schemes/${schemeId}/runs/${runId}/progress`;
  const source = new EventSource(path);
  let faults = 0;
  source.addEventListener('message', (event: MessageEvent<unknown>) => {
    const progress = progressOf(event);
    if (progress === null) return;
    faults = 0;
    if (!isActive(progress)) source.close();
    listener.onProgress(progress);
  });
  source.addEventListener('error', () => {
    faults += 1;
    if (source.readyState !== EventSource.CLOSED && faults < 2) return;
    source.close();
    listener.onBroken();
  });
  return () => {
    source.close();
  };
}
