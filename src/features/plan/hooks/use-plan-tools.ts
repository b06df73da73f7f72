import { useState } from 'react';
import type { BuildingAnswer } from '../../../../shared/schemas/buildings.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { usePlanLine } from '../../alignments/hooks/use-plan-line.ts';
import { usePlanDrawing } from '../../drawing/hooks/use-plan-drawing.ts';
import { can } from '../../schemes/can.ts';

type Around = {
  readonly isWriting: boolean;
  readonly building: BuildingAnswer | undefined;
  readonly select: (buildingId: number | null) => void;
};

/** What is drawn on the plan: a building or the line, one at a time. */
export function usePlanTools(scheme: SchemeAnswer, around: Around) {
  const [isBusy, setBusy] = useState(false);
  const line = usePlanLine(scheme, isBusy);
  const { isEditing } = line.editor;
  const canDraw = can(scheme, 'updateRegister') && !isEditing;
  const drawing = usePlanDrawing({ ...around, schemeId: scheme.id, canDraw });
  const isBuilding = drawing.map !== null || around.isWriting;
  // the line's tools rest from the next moment on
  if (isBuilding !== isBusy) setBusy(isBuilding);
  return { line, drawing, isDrawing: drawing.map !== null || isEditing };
}
