import { useState } from 'react';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';
import { Button } from '../../../components/ui/button.tsx';
import { useWidth } from '../../../hooks/use-width.ts';
import { useSectionChainage, type SectionDesk } from '../hooks/use-section-desk.ts';
import { useSectionKeys } from '../hooks/use-section-keys.ts';
import type { ShownRun } from '../shown-categories.ts';
import { AcrossView } from './across-view.tsx';
import { AlongView } from './along-view.tsx';
import { EmptySection } from './empty-section.tsx';
import { StripEdge } from './strip-edge.tsx';

type SectionStripProps = {
  readonly desk: SectionDesk;
  readonly selected: number | null;
  readonly shown: ShownRun;
};

/** Before it is measured, and on paper: what A4 holds upright. */
const PAPER_WIDTH = 680;

function OpenSection({
  desk,
  design,
  selected,
  shown,
}: SectionStripProps & { readonly design: AlignmentDesign }) {
  const { strip, store, length } = desk;
  const chainage = useSectionChainage(desk);
  const [isTable, setTable] = useState(false);
  const { width, frame } = useWidth(PAPER_WIDTH, PAPER_WIDTH);
  function turn(): void {
    setTable((now) => !now);
  }
  useSectionKeys({ chainage, length, onGo: store.set, onTable: turn });
  const tools = { strip, chainage, onGo: store.set, isTable, onTable: turn };
  const view = { desk, design, tools, chainage, selected, shown, width };
  return (
    <div ref={frame} className="overflow-hidden">
      {strip.view === 'across' ? <AcrossView {...view} /> : <AlongView {...view} />}
    </div>
  );
}

/** Under the map: the section across or along the line that is shown. */
export function SectionStrip({ desk, selected, shown }: SectionStripProps) {
  const { line, strip } = desk;
  if (!line.isKnown) return null;
  // a map that shrinks between two presses would take the second one elsewhere
  const design = line.editor.isDrawing ? null : line.design;
  function open(isOpen: boolean): void {
    strip.open(isOpen);
  }
  return (
    <section aria-label="Section" className="relative border-t border-ink bg-paper-raised">
      {!strip.isOpen && (
        <div className="px-4 py-1 print:hidden">
          <Button
            kind="quiet"
            className="-ml-1.5"
            aria-expanded={false}
            onClick={() => {
              open(true);
            }}
          >
            Show the section
          </Button>
        </div>
      )}
      {strip.isOpen && design === null && (
        <EmptySection
          line={line}
          onHide={() => {
            open(false);
          }}
        />
      )}
      {strip.isOpen && design !== null && (
        <>
          <StripEdge strip={strip} />
          <OpenSection {...{ desk, selected, shown }} design={design} />
        </>
      )}
    </section>
  );
}
