import { useState } from 'react';
import type { BuildingRow } from '../../../../shared/schemas/buildings.ts';
import { stepThrough } from '../step-through.ts';

/** Buildings that were searched for, to be gone through one by one. */
export type Trail = { readonly words: string; readonly ids: readonly number[] };

/** Going through what was found, or else through what is in view. */
export function useSteps(
  selected: number | null,
  inView: () => readonly number[],
  goTo: (buildingId: number) => void,
) {
  const [trail, setTrail] = useState<Trail | null>(null);
  return {
    trail,
    follow: (words: string, found: readonly BuildingRow[]) => {
      setTrail({ words, ids: found.map(({ id }) => id) });
    },
    leave: () => {
      setTrail(null);
    },
    step: (by: 1 | -1) => {
      const next = stepThrough(trail?.ids ?? inView(), selected, by);
      if (next !== null) goTo(next);
    },
  };
}
