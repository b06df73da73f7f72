import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { MutationError } from '../../../components/ui/mutation-error.tsx';
import { lineOf, partsOf, type ShapeDraft } from '../drafts/draft.ts';
import { addCorner, takeLastBack } from '../drafts/edit-corners.ts';
import { splitLine } from '../drafts/split-line.ts';
import { splitPreview } from '../drafts/split-preview.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { AddCorner } from './add-corner.tsx';
import { BaseClash } from './base-clash.tsx';
import { CornerTable } from './corner-table.tsx';
import { GiveUp } from './give-up.tsx';
import { PanelFrame } from './panel-frame.tsx';
import { SplitResult } from './split-result.tsx';

type SplitPanelProps = { readonly drawing: PlanDrawing; readonly draft: ShapeDraft };

/** A building while the line is drawn that splits it. */
export function SplitPanel({ drawing, draft }: SplitPanelProps) {
  const { drafting, saving, save, press } = drawing;
  const reference = draft.building?.reference ?? '';
  const line = lineOf(draft);
  const pieces = splitPreview(partsOf(draft.building?.footprint ?? []), splitLine(line));
  return (
    <PanelFrame
      title={`Split ${reference}`}
      hint="Press one side of the building, then the other: the line cuts right through. Bends are pressed in between."
      actions={
        <>
          {pieces.length > 1 && saving.fresh === null && (
            <Button
              kind="main"
              busy={saving.isPending}
              onClick={() => {
                save();
              }}
            >
              Split it{' '}
              <span className="max-sm:hidden">
                <KeyCap>Enter</KeyCap>
              </span>
            </Button>
          )}
          {line.length > 0 && (
            <Button
              onClick={() => {
                drafting.editShape(takeLastBack);
              }}
            >
              Take last back
            </Button>
          )}
          <GiveUp press={press} />
        </>
      }
    >
      <MutationError failed="The building was not split." error={saving.error} />
      <BaseClash drawing={drawing} draft={draft} />
      <SplitResult reference={reference} line={line} pieces={pieces} />
      <CornerTable draft={draft} chosen={null} onEdit={drafting.editShape} />
      <AddCorner
        what="point"
        onAdd={(place) => {
          drafting.editShape((now) => addCorner(now, place));
        }}
      />
    </PanelFrame>
  );
}
