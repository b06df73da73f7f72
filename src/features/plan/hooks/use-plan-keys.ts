import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import type { MapHandle } from '../../map/map-handle.ts';

type PlanKeys = {
  readonly handle: MapHandle | null;
  readonly step: (by: 1 | -1) => void;
  readonly fit: () => void;
  readonly deselect: () => void;
};

/** The keys of the plan; arrows move the map only while it has the focus. */
export function usePlanKeys({ handle, step, fit, deselect }: PlanKeys): void {
  const closer = () => handle?.zoomBy(1);
  useHotkeys({
    j: () => {
      step(1);
    },
    k: () => {
      step(-1);
    },
    f: fit,
    '+': closer,
    '=': closer,
    '-': () => handle?.zoomBy(-1),
    Escape: deselect,
  });
}
