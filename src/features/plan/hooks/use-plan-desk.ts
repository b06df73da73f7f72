import { useState } from 'react';
import type { MapHandle } from '../../map/map-handle.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useBringIntoView } from './use-bring-into-view.ts';
import { useBuildingQuery } from './use-building-query.ts';
import { usePlanKeys } from './use-plan-keys.ts';
import { usePlanTools } from './use-plan-tools.ts';
import { useSchemePlan } from './use-scheme-plan.ts';
import { useSelectedBuilding } from './use-selected-building.ts';
import { useSheetView } from './use-sheet-view.ts';
import { useSteps } from './use-steps.ts';

function doNothing(): void {
  // keys that go from building to building rest while something is drawn or written
}

/** The plan at work: its map, the building that is selected, what is drawn and what is written. */
export function usePlanDesk() {
  const scheme = useScheme();
  const schemePlan = useSchemePlan();
  const { ready } = schemePlan;
  const [selected, select] = useSelectedBuilding();
  const [handle, setHandle] = useState<MapHandle | null>(null);
  const { building, known } = useBuildingQuery(scheme.id, selected);
  const { view, setView, isWriting } = useSheetView(selected);
  const canDraw = can(scheme, 'updateRegister');
  const tools = usePlanTools(scheme, { isWriting, building: known, select });
  const { drawing, isDrawing } = tools;
  const bring = useBringIntoView(handle, selected, building.data);

  function goTo(buildingId: number): void {
    bring(buildingId);
    select(buildingId);
  }
  function deselect(): void {
    select(null);
  }
  function fit(): void {
    if (ready !== null) handle?.fit(ready.extent.home);
  }
  const steps = useSteps({
    handle,
    selected,
    isThere: selected === null || building.data?.id === selected,
    goTo,
  });
  usePlanKeys(
    {
      handle,
      step: isDrawing || isWriting ? doNothing : steps.step,
      fit,
      deselect: isWriting ? doNothing : deselect,
    },
    ready?.extent.from === 'buildings',
  );
  const changing = { onView: setView, onChanged: drawing.changedByHand };
  const sheet = { schemeId: scheme.id, mayEdit: canDraw, view, ...changing };
  return {
    schemePlan,
    selected,
    select,
    handle,
    setHandle,
    building,
    sheet,
    ...tools,
    steps,
    goTo,
    deselect,
  };
}
