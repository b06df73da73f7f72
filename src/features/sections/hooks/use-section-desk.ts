import { useMemo, useState, useSyncExternalStore } from 'react';
import { BESIDE_LINE } from '../../alignments/cursor-words.ts';
import { lengthOf } from '../../alignments/option-changes.ts';
import { placeOnLine } from '../../alignments/place-on-line.ts';
import type { SectionShape } from '../../map/map-line.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';
import { usePerson } from '../../session/person-context.ts';
import { reachOfDesign } from '../reach-of-design.ts';
import type { SectionLine } from '../section-line.ts';
import { sectionMark } from '../section-mark.ts';
import { createSectionStore } from '../section-store.ts';
import { useStripChoice } from './use-strip-choice.ts';

/** The section of the plan: where it is, how it is shown, and the line that it cuts. */
export function useSectionDesk(line: SectionLine) {
  const strip = useStripChoice(usePerson().id);
  const [store] = useState(createSectionStore);
  const { design } = line;
  const length = useMemo(() => (design === null ? 0 : lengthOf(design.line)), [design]);
  return {
    ...{ line, strip, store, length },
    /** The section goes to where the cursor is, if that is beside the line. */
    point: (place: GridPlace) => {
      const at = design === null || !strip.isOpen ? null : placeOnLine(design.line, place);
      if (at !== null && Math.abs(at.offset) <= BESIDE_LINE) store.set(at.chainage);
    },
  };
}

export type SectionDesk = ReturnType<typeof useSectionDesk>;

/** Where the section is: where somebody pointed last, or half-way along the line. */
export function useSectionChainage({ store, length }: SectionDesk): number {
  const pointed = useSyncExternalStore(store.subscribe, store.get);
  return pointed === null ? length / 2 : Math.min(length, Math.max(0, pointed));
}

const NOTHING: readonly SectionShape[] = [];

/** The mark of the section on the map, while it is shown. */
export function useSectionMark(desk: SectionDesk): readonly SectionShape[] {
  const chainage = useSectionChainage(desk);
  const { design } = desk.line;
  const { isOpen } = desk.strip;
  return useMemo(() => {
    if (design === null || !isOpen || desk.length === 0) return NOTHING;
    return sectionMark(design, chainage, reachOfDesign(design));
  }, [design, isOpen, desk.length, chainage]);
}
