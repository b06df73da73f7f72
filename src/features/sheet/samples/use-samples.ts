import { useEffect, useState } from 'react';
import type { OpenedSamples } from '../../../../shared/assessment/opened-samples.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { drawInThread } from './open-samples-worker.ts';

/** How the drawing stands; what was drawn before stays until the next is there. */
export type SamplesState = {
  readonly samples: OpenedSamples | null;
  readonly isDrawing: boolean;
  readonly hasFailed: boolean;
};

type Drawn = { readonly seed: number; readonly samples: OpenedSamples | null | 'fault' };

/** The samples of a seed; none are drawn while there is none. */
export function useSamples(
  run: RunDetail,
  building: RunBuilding,
  seed: number | null,
): SamplesState {
  const [drawn, setDrawn] = useState<Drawn>();
  const { facts, rows } = building;
  useEffect(() => {
    if (seed === null) return undefined;
    const { design, rules } = run;
    return drawInThread(
      { run: { design, rules }, building: { facts, rows }, seed },
      {
        onDrawn: (samples) => {
          setDrawn({ seed, samples });
        },
        onFault: () => {
          setDrawn({ seed, samples: 'fault' });
        },
      },
    );
  }, [run, facts, rows, seed]);
  const found = seed === null ? undefined : drawn;
  return {
    samples: found?.samples === 'fault' ? null : (found?.samples ?? null),
    isDrawing: seed !== null && found?.seed !== seed,
    hasFailed: found?.samples === 'fault' && found.seed === seed,
  };
}
