import { useRef } from 'react';
import { DrawingSide } from '../../drawing/components/drawing-side.tsx';
import { DrawingTools } from '../../drawing/components/drawing-tools.tsx';
import { useScheme } from '../../schemes/scheme-context.ts';
import { usePlanDesk } from '../hooks/use-plan-desk.ts';
import { MapPane } from './map-pane.tsx';
import { PlanBasis } from './plan-basis.tsx';
import { PlanSide } from './plan-side.tsx';

/** The map and what stands at its side; on a phone, under it. */
export function PlanDesk() {
  const scheme = useScheme();
  const desk = usePlanDesk();
  const { schemePlan, selected, select, building, sheet, drawing, steps } = desk;
  const { ready } = schemePlan;
  const chosen = useRef<HTMLDivElement>(null);
  return (
    <>
      <PlanBasis scheme={scheme} crs={ready?.crs} />
      <div className="relative grid min-h-0 flex-1 grid-cols-[minmax(0,1fr)_312px] max-md:flex max-md:flex-none max-md:flex-col">
        <div className="min-w-0 max-md:h-[46vh] max-md:min-h-[300px]">
          <MapPane
            {...schemePlan}
            selected={drawing.map === null ? selected : null}
            drawing={drawing.map}
            onSelect={drawing.pressBuilding}
            onHandle={desk.setHandle}
          />
        </div>
        <DrawingTools drawing={drawing} select={select} />
        <aside
          aria-label="Buildings"
          className="min-h-0 overflow-auto border-l border-ink bg-paper px-4 pt-3.5 pb-6 max-md:overflow-visible max-md:border-t max-md:border-l-0"
        >
          <DrawingSide drawing={drawing}>
            <PlanSide
              {...{ selected, building, sheet, steps, chosen }}
              from={ready?.extent.from}
              onGoTo={desk.goTo}
              onDeselect={desk.deselect}
            />
          </DrawingSide>
        </aside>
      </div>
    </>
  );
}
