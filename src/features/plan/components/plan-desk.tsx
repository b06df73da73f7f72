import { useRef } from 'react';
import { GiveUpLine } from '../../alignments/components/give-up-line.tsx';
import { LineSide } from '../../alignments/components/line-side.tsx';
import { LineTools } from '../../alignments/components/line-tools.tsx';
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
  const { schemePlan, selected, select, building, sheet, drawing, steps, line } = desk;
  const { ready } = schemePlan;
  const chosen = useRef<HTMLDivElement>(null);
  return (
    <>
      <PlanBasis scheme={scheme} crs={ready?.crs} line={line} />
      <div className="relative grid min-h-0 flex-1 grid-cols-[minmax(0,1fr)_312px] max-md:flex max-md:flex-none max-md:flex-col">
        <div className="min-w-0 max-md:h-[46vh] max-md:min-h-[300px]">
          <MapPane
            {...schemePlan}
            selected={desk.isDrawing ? null : selected}
            drawing={line.map ?? drawing.map}
            line={line.shapes}
            wordsAt={line.wordsAt}
            onSelect={drawing.pressBuilding}
            onHandle={desk.setHandle}
          />
        </div>
        <DrawingTools drawing={drawing} select={select} />
        <LineTools line={line} isBeside={drawing.canDraw} />
        <GiveUpLine editor={line.editor} />
        <aside
          aria-label="Buildings"
          className="min-h-0 overflow-auto border-l border-ink bg-paper px-4 pt-3.5 pb-6 max-md:overflow-visible max-md:border-t max-md:border-l-0"
        >
          <LineSide line={line} isOptionShown={selected === null && !desk.isDrawing}>
            <DrawingSide drawing={drawing}>
              <PlanSide
                {...{ selected, building, sheet, steps, chosen }}
                from={ready?.extent.from}
                onGoTo={desk.goTo}
                onDeselect={desk.deselect}
              />
            </DrawingSide>
          </LineSide>
        </aside>
      </div>
    </>
  );
}
