import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import type { ShapeDraft } from '../drafts/draft.ts';
import { lineOf } from '../drafts/draft.ts';
import { addCorner, closeOutline, LEAST_CORNERS, takeLastBack } from '../drafts/edit-corners.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { areaWords } from '../measure-words.ts';
import { AddCorner } from './add-corner.tsx';
import { CornerTable } from './corner-table.tsx';
import { FigureLine } from './figure-line.tsx';
import { GiveUp } from './give-up.tsx';
import { PanelFrame } from './panel-frame.tsx';
import { RightAngles } from './right-angles.tsx';

type DrawPanelProps = { readonly drawing: PlanDrawing; readonly draft: ShapeDraft };

/** A new building while its corners are set. */
export function DrawPanel({ drawing, draft }: DrawPanelProps) {
  const { drafting, square, press } = drawing;
  const count = lineOf(draft).length;
  const canClose = count >= LEAST_CORNERS;
  return (
    <PanelFrame
      title="Draw a building"
      hint="Press the corners on the map one after another, or write them here. Corners and walls of neighbours are taken exactly."
      actions={
        <>
          {canClose && (
            <Button
              kind="main"
              onClick={() => {
                drafting.editShape(closeOutline);
              }}
            >
              Close the outline
            </Button>
          )}
          {count > 0 && (
            <Button
              onClick={() => {
                drafting.editShape(takeLastBack);
              }}
            >
              Take last back{' '}
              <span className="max-sm:hidden">
                <KeyCap>⌫</KeyCap>
              </span>
            </Button>
          )}
          <GiveUp press={press} />
        </>
      }
    >
      <RightAngles square={square} />
      {canClose && (
        <dl className="mt-1.5">
          <FigureLine label="Area if closed now" value={areaWords(draft.parts)} />
        </dl>
      )}
      <CornerTable draft={draft} chosen={null} onEdit={drafting.editShape} />
      <AddCorner
        what="corner"
        onAdd={(place) => {
          drafting.editShape((now) => addCorner(now, place));
        }}
      />
    </PanelFrame>
  );
}
