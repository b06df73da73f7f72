import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';
import { SECTION_KEYS } from '../section-keys.ts';

const STEP = 5;

type SectionKeys = {
  readonly chainage: number;
  readonly length: number;
  readonly onGo: (chainage: number) => void;
  readonly onTable: () => void;
};

/** The keys of a section: a step back, a step on, and its table. */
export function useSectionKeys({ chainage, length, onGo, onTable }: SectionKeys): void {
  useKeyHelp(SECTION_KEYS);
  useHotkeys({
    ',': () => {
      onGo(Math.max(0, chainage - STEP));
    },
    '.': () => {
      onGo(Math.min(length, chainage + STEP));
    },
    t: onTable,
  });
}
