import { Button } from '../../../components/ui/button.tsx';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import type { ShapeDraft } from '../drafts/draft.ts';
import { lineOf } from '../drafts/draft.ts';
import { addCorner, LEAST_CORNERS, takeLastBack } from '../drafts/edit-corners.ts';
import { addingOf, closeRing, leaveRing, reasonToStayOpen } from '../drafts/edit-rings.ts';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { areaWords } from '../measure-words.ts';
import { RING_WORDS } from '../ring-words.ts';
import { AddCorner } from './add-corner.tsx';
import { CornerTable } from './corner-table.tsx';
import { FigureLine } from './figure-line.tsx';
import { GiveUp } from './give-up.tsx';
import { PanelFrame } from './panel-frame.tsx';
import { RightAngles } from './right-angles.tsx';

type DrawPanelProps = { readonly drawing: PlanDrawing; readonly draft: ShapeDraft };

function LeaveOut({ drafting }: Pick<PlanDrawing, 'drafting'>) {
  return (
    <Button
      onClick={() => {
        drafting.editShape(leaveRing);
      }}
    >
      Leave it out{' '}
      <span className="max-sm:hidden">
        <KeyCap>Esc</KeyCap>
      </span>
    </Button>
  );
}

function DrawActions({ drawing, draft }: DrawPanelProps) {
  const { drafting, press } = drawing;
  const count = lineOf(draft).length;
  const adding = addingOf(draft);
  const canClose = count >= LEAST_CORNERS && reasonToStayOpen(draft) === null;
  return (
    <>
      {canClose && (
        <Button
          kind="main"
          onClick={() => {
            drafting.editShape(closeRing);
          }}
        >
          {RING_WORDS[adding ?? 'outline'].close}
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
      {adding === null ? <GiveUp press={press} /> : <LeaveOut drafting={drafting} />}
    </>
  );
}

/** An outline, a courtyard or another part while its corners are set. */
export function DrawPanel({ drawing, draft }: DrawPanelProps) {
  const { drafting, square } = drawing;
  const line = lineOf(draft);
  const adding = addingOf(draft);
  const { title, hint, area } = RING_WORDS[adding ?? 'outline'];
  const reason = line.length === 0 ? null : reasonToStayOpen(draft);
  return (
    <PanelFrame title={title} hint={hint} actions={<DrawActions drawing={drawing} draft={draft} />}>
      <RightAngles square={square} />
      {line.length >= LEAST_CORNERS && (
        <dl className="mt-1.5">
          <FigureLine label={area} value={areaWords([[line]])} />
          {adding !== null && (
            <FigureLine label="The building with it" value={areaWords(draft.parts)} />
          )}
        </dl>
      )}
      <p role="status" className="text-small font-medium text-clay-deep not-empty:py-1">
        {reason}
      </p>
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
