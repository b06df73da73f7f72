import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';
import { RUN_KEYS } from '../run-keys.ts';
import type { End } from '../shades-of-run.ts';

/** The keys that choose which end of the likely range is shown. */
export function useRunKeys(showEnd: (end: End) => void, isActive: boolean): void {
  useKeyHelp(RUN_KEYS, isActive);
  const keys = {
    1: () => {
      showEnd('low');
    },
    2: () => {
      showEnd('central');
    },
    3: () => {
      showEnd('high');
    },
  };
  useHotkeys(keys, isActive);
}
