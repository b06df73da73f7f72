import type { BuildingSheet } from '../../../../shared/assessment/sheet-of-building.ts';
import { factsOfRun } from '../../../../shared/presentation/facts-of-run.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { BuildingFacts } from '../../buildings/components/building-facts.tsx';
import { PlanExtract } from './plan-extract.tsx';
import { WallTable } from './wall-table.tsx';

type SheetPlaceProps = {
  readonly schemeId: string;
  readonly run: RunDetail;
  readonly building: RunBuilding;
  readonly sheet: BuildingSheet;
  /** The wall that is opened. */
  readonly index: number;
  readonly onChoose: (index: number) => void;
};

/** Where the building stands, its walls by letter, and what is known of it. */
export function SheetPlace(props: SheetPlaceProps) {
  const { schemeId, run, building, sheet, index, onChoose } = props;
  const address = building.facts.name === null ? null : building.facts.address;
  return (
    <div className="min-w-0 print:grid print:grid-cols-[300px_minmax(0,1fr)] print:gap-x-8 print:[&>section]:mt-0">
      <Panel title="Walls" note="by letter; the clay one is opened">
        <PlanExtract {...{ schemeId, run, building, sheet, index }} />
        {sheet.strain !== null && (
          <WallTable strain={sheet.strain} index={index} onChoose={onChoose} />
        )}
      </Panel>
      <Panel title="Facts" note="as the run took them; dotted where assumed">
        {address !== null && <p className="mt-2 text-small">{address}</p>}
        {/* the heading has its rule already */}
        <div className="[&>dl]:mt-0 [&>dl]:border-t-0">
          <BuildingFacts building={factsOfRun(building, sheet)} />
        </div>
      </Panel>
    </div>
  );
}
