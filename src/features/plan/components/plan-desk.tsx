import { useRef, useState } from 'react';
import { DrawingSide } from '../../drawing/components/drawing-side.tsx';
import { DrawingTools } from '../../drawing/components/drawing-tools.tsx';
import { usePlanDrawing } from '../../drawing/hooks/use-plan-drawing.ts';
import type { MapHandle } from '../../map/map-handle.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useBringIntoView } from '../hooks/use-bring-into-view.ts';
import { useBuildingQuery } from '../hooks/use-building-query.ts';
import { usePlanKeys } from '../hooks/use-plan-keys.ts';
import { useSchemePlan } from '../hooks/use-scheme-plan.ts';
import { useSelectedBuilding } from '../hooks/use-selected-building.ts';
import { useSheetView } from '../hooks/use-sheet-view.ts';
import { useSteps } from '../hooks/use-steps.ts';
import { MapPane } from './map-pane.tsx';
import { PlanBasis } from './plan-basis.tsx';
import { PlanSide } from './plan-side.tsx';

function doNothing(): void {
  // keys that go from building to building rest while something is drawn or written
}

/** The map and what stands at its side; on a phone, under it. */
export function PlanDesk() {
  const scheme = useScheme();
  const schemePlan = useSchemePlan();
  const { ready } = schemePlan;
  const [selected, select] = useSelectedBuilding();
  const [handle, setHandle] = useState<MapHandle | null>(null);
  const chosen = useRef<HTMLDivElement>(null);
  const { building, known } = useBuildingQuery(scheme.id, selected);
  const canDraw = scheme.abilities.updateRegister === true;
  const { view, setView, isWriting } = useSheetView(selected);
  const around = { schemeId: scheme.id, canDraw, isWriting, building: known, select };
  const drawing = usePlanDrawing(around);
  const isDrawing = drawing.map !== null;
  const bring = useBringIntoView(handle, selected, building.data);

  function goTo(buildingId: number): void {
    bring(buildingId);
    select(buildingId);
  }
  function deselect(): void {
    select(null);
  }
  function fit(): void {
    if (ready !== null) handle?.fit(ready.extent.bounds);
  }
  const steps = useSteps(selected, () => handle?.buildingsInView() ?? [], goTo);
  usePlanKeys(
    {
      handle,
      step: isDrawing || isWriting ? doNothing : steps.step,
      fit,
      deselect: isWriting ? doNothing : deselect,
    },
    ready?.extent.from === 'buildings',
  );

  return (
    <>
      <PlanBasis scheme={scheme} crs={ready?.crs} />
      <div className="relative grid min-h-0 flex-1 grid-cols-[minmax(0,1fr)_312px] max-md:flex max-md:flex-none max-md:flex-col">
        <div className="min-w-0 max-md:h-[46vh] max-md:min-h-[300px]">
          <MapPane
            {...schemePlan}
            selected={isDrawing ? null : selected}
            drawing={drawing.map}
            onSelect={drawing.pressBuilding}
            onHandle={setHandle}
          />
        </div>
        <DrawingTools drawing={drawing} select={select} />
        <aside
          aria-label="Buildings"
          className="min-h-0 overflow-auto border-l border-ink bg-paper px-4 pt-3.5 pb-6 max-md:overflow-visible max-md:border-t max-md:border-l-0"
        >
          <DrawingSide drawing={drawing}>
            <PlanSide
              {...{ selected, building, steps, chosen }}
              from={ready?.extent.from}
              sheet={{
                ...{ schemeId: scheme.id, mayEdit: canDraw, view, onView: setView },
                onChanged: drawing.changedByHand,
              }}
              onGoTo={goTo}
              onDeselect={deselect}
            />
          </DrawingSide>
        </aside>
      </div>
    </>
  );
}
