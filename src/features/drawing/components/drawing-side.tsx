import type { ReactNode } from 'react';
import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { DoneLine } from './done-line.tsx';
import { DrawingPanel } from './drawing-panel.tsx';

type DrawingSideProps = {
  readonly drawing: PlanDrawing;
  /** Stands there while nothing is drawn. */
  readonly children: ReactNode;
};

/** At the side of the map: what was done last, and what is drawn or else the rest. */
export function DrawingSide({ drawing, children }: DrawingSideProps) {
  const { draft } = drawing.drafting;
  return (
    <>
      {!drawing.situation.isWriting && <DoneLine done={drawing.done} />}
      {draft === null ? (
        children
      ) : (
        <DrawingPanel key={draft.tool} drawing={drawing} draft={draft} />
      )}
    </>
  );
}
