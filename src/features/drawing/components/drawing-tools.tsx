import type { PlanDrawing } from '../hooks/use-plan-drawing.ts';
import { UnsavedEdits } from '../../../components/ui/unsaved-edits.tsx';
import { GiveUpDialog } from './give-up-dialog.tsx';
import { RemoveDialog } from './remove-dialog.tsx';
import { ToolColumn } from './tool-column.tsx';

type DrawingToolsProps = {
  readonly drawing: PlanDrawing;
  readonly select: (buildingId: number | null) => void;
};

/** The tools beside the map, for who may draw, and what they ask before something is lost. */
export function DrawingTools({ drawing, select }: DrawingToolsProps) {
  const { canDraw, drafting, schemeId, removing, done, situation, press } = drawing;
  if (!canDraw) return null;
  return (
    <>
      <ToolColumn situation={situation} onPress={press} />
      <GiveUpDialog drafting={drafting} />
      {drafting.isWorthKeeping && <UnsavedEdits hasEdits what="What you drew" />}
      <RemoveDialog {...{ schemeId, removing, done, select }} />
    </>
  );
}
