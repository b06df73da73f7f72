import { useRef } from 'react';
import { GiveUpLine } from '../../alignments/components/give-up-line.tsx';
import { LineSide } from '../../alignments/components/line-side.tsx';
import { LineTools } from '../../alignments/components/line-tools.tsx';
import { DrawingSide } from '../../drawing/components/drawing-side.tsx';
import { DrawingTools } from '../../drawing/components/drawing-tools.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { PrintPlan } from '../../evidence/components/print-plan.tsx';
import { RunLegend } from '../../runs/components/run-legend.tsx';
import { RunNotes } from '../../runs/components/run-notes.tsx';
import { RunProgressLine } from '../../runs/components/run-progress-line.tsx';
import { useRunView } from '../../runs/hooks/use-run-view.ts';
import { SectionStrip } from '../../sections/components/section-strip.tsx';
import { useSectionDesk } from '../../sections/hooks/use-section-desk.ts';
import { usePlanDesk } from '../hooks/use-plan-desk.ts';
import { MapWithSection } from './map-with-section.tsx';
import { PlanBasis } from './plan-basis.tsx';
import { PlanSide } from './plan-side.tsx';

/** The map and what stands at its side; on a phone, under it. */
export function PlanDesk() {
  const scheme = useScheme();
  const desk = usePlanDesk();
  const { schemePlan, selected, select, building, sheet, drawing, steps, line } = desk;
  const { ready } = schemePlan;
  const view = useRunView(scheme.id, line.run);
  const sections = useSectionDesk(line);
  const chosen = useRef<HTMLDivElement>(null);
  const print =
    view.run !== null && desk.handle !== null && can(scheme, 'prepareEvidence') ? (
      <PrintPlan key="print" {...view} run={view.run} middle={desk.handle.middle} />
    ) : undefined;
  return (
    <>
      <PlanBasis scheme={scheme} crs={ready?.crs} line={line} view={view} print={print} />
      <RunProgressLine>
        <RunNotes line={line} />
      </RunProgressLine>
      <div className="relative grid min-h-0 flex-1 grid-cols-[minmax(0,1fr)_312px] grid-rows-[minmax(160px,1fr)_auto] max-md:flex max-md:flex-none max-md:flex-col print:block">
        <div className="min-w-0 max-md:h-[46vh] max-md:min-h-[300px] md:col-start-1 md:row-start-1 print:h-[100mm] print:overflow-hidden">
          <MapWithSection
            {...schemePlan}
            selected={desk.isDrawing ? null : selected}
            drawing={line.map ?? drawing.map}
            line={line.shapes}
            wordsAt={line.wordsAt}
            shades={view.shades}
            tipOf={view.tipOf}
            sections={sections}
            onSelect={drawing.pressBuilding}
            onHandle={desk.setHandle}
          />
        </div>
        <DrawingTools drawing={drawing} select={select} />
        <LineTools line={line} isBeside={drawing.canDraw} />
        <RunLegend view={view} isPreview={line.isPreview || line.editor.isEditing} />
        <GiveUpLine editor={line.editor} />
        <div className="col-start-1 row-start-2 min-w-0 print:break-inside-avoid">
          <SectionStrip desk={sections} selected={selected} shown={view} />
        </div>
        <aside
          aria-label="Buildings"
          className="col-start-2 row-span-2 row-start-1 min-h-0 overflow-auto border-l border-ink bg-paper px-4 pt-3.5 pb-6 max-md:overflow-visible max-md:border-t max-md:border-l-0"
        >
          <LineSide line={line} isOptionShown={selected === null && !desk.isDrawing}>
            <DrawingSide drawing={drawing}>
              <PlanSide
                {...{ selected, building, sheet, steps, chosen }}
                run={line.run}
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
