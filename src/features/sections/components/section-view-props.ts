import type { SectionDesk } from '../hooks/use-section-desk.ts';
import type { ShownRun } from '../shown-categories.ts';
import type { StripTools } from './strip-head.tsx';

/** What either view of the section is told. */
export type SectionViewProps = {
  readonly desk: SectionDesk;
  readonly tools: StripTools;
  readonly chainage: number;
  /** Of the strip, in pixels. */
  readonly width: number;
  readonly selected: number | null;
  readonly shown: ShownRun;
};
