import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { QueryError } from '../../../components/ui/query-error.tsx';
import { Segments } from '../../../components/ui/segments.tsx';
import type { EvidenceDesk } from '../hooks/use-evidence-desk.ts';
import { ScheduleNote } from './schedule-note.tsx';
import { SheetView } from './sheet-view.tsx';

const SIZES = [
  { value: 'whole', label: 'Whole sheet' },
  { value: 'true', label: 'True size' },
] as const;

type Size = (typeof SIZES)[number]['value'];

function Turning({ number, setNumber, sheets: { count } }: EvidenceDesk) {
  if (count < 2) return null;
  return (
    <div role="group" aria-label="Sheet" className="flex items-center gap-2 text-small">
      {number > 1 && (
        <Button
          kind="quiet"
          onClick={() => {
            setNumber(number - 1);
          }}
        >
          Previous
        </Button>
      )}
      <span aria-live="polite">
        Sheet <b>{number}</b> of {count}
      </span>
      {number < count && (
        <Button
          kind="quiet"
          onClick={() => {
            setNumber(number + 1);
          }}
        >
          Next
        </Button>
      )}
    </div>
  );
}

/** Why there is nothing to see; null where there is. */
function absence({ faults, sheets }: EvidenceDesk): string | null {
  if (Object.keys(faults).length > 0) return 'Mend what is marked to see the sheet.';
  return sheets.drawn.length === 0 ? 'The sheet is being drawn.' : null;
}

/** One sheet as it will be printed, with the lists behind it. */
export function SheetPane({ desk }: { readonly desk: EvidenceDesk }) {
  const [size, setSize] = useState<Size>('whole');
  const { sheets, move, schemeId, layout, runs } = desk;
  if (layout?.kind === 'schedule') return <ScheduleNote {...{ schemeId }} run={runs.run} />;
  if (sheets.error !== null) {
    return (
      <QueryError what="What stands on the sheet" error={sheets.error} onRetry={sheets.retry} />
    );
  }
  const words = absence(desk);
  if (words !== null) return <EmptyState>{words}</EmptyState>;
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <Segments label="How large" segments={SIZES} value={size} onChange={setSize} />
        <Turning {...desk} />
        {move !== null && (
          <span className="text-cap text-ink-3 max-sm:hidden">
            Drag the sheet, or press arrow keys on it, to move its frame.
          </span>
        )}
        {sheets.isStale && (
          <span className="appear-late text-cap text-ink-3">Drawing it anew.</span>
        )}
      </div>
      <div className="grid gap-4 overflow-auto">
        {sheets.drawn.map((sheet, k) => (
          <SheetView
            key={k}
            sheet={sheet}
            isTrueSize={size === 'true'}
            onMove={k === 0 ? move : null}
          />
        ))}
      </div>
    </div>
  );
}
