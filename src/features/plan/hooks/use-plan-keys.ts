import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';
import type { MapHandle } from '../../map/map-handle.ts';
import { BUILDING_KEYS, MAP_KEYS } from '../plan-keys.ts';

type PlanKeys = {
  readonly handle: MapHandle | null;
  readonly step: (by: 1 | -1) => void;
  readonly fit: () => void;
  readonly deselect: () => void;
};

/** The keys of the plan; arrows move the map only while it has the focus. */
export function usePlanKeys(
  { handle, step, fit, deselect }: PlanKeys,
  hasBuildings: boolean,
): void {
  useKeyHelp(MAP_KEYS, handle !== null);
  useKeyHelp(BUILDING_KEYS, hasBuildings);
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
