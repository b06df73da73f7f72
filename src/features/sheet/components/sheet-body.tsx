import { useMemo, useState } from 'react';
import { openWall } from '../../../../shared/assessment/open-wall.ts';
import type { BuildingSheet } from '../../../../shared/assessment/sheet-of-building.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { Panel } from '../../../components/ui/panel.tsx';
import { WorkingList } from '../../assessment/components/working-list.tsx';
import { OwnersOfBuilding } from '../../matters/components/owners-of-building.tsx';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { VisitsOfBuilding } from '../../visits/components/visits-of-building.tsx';
import { SheetAnswers } from './sheet-answers.tsx';
import { SheetPlace } from './sheet-place.tsx';
import { SheetSection } from './sheet-section.tsx';

type SheetBodyProps = {
  readonly schemeId: string;
  readonly run: RunDetail;
  readonly building: RunBuilding;
  readonly sheet: BuildingSheet;
};

/** What a sheet shows of its building, with one wall opened: the one that governs, until another is chosen. */
export function SheetBody({ schemeId, run, building, sheet }: SheetBodyProps) {
  const scheme = useScheme();
  const [chosen, setChosen] = useState<number>();
  const { strain, inputs } = sheet;
  const index = chosen ?? Math.max(0, strain?.governing ?? 0);
  const wall = strain?.walls[index]?.wall;
  const opened = useMemo(
    () => (wall === undefined ? null : openWall(inputs.model, wall, inputs.rules, [])),
    [inputs, wall],
  );
  return (
    <div className="grid gap-x-8 px-8 pt-4 pb-8 max-sm:px-4 xl:grid-cols-[300px_minmax(0,1fr)_320px] lg:grid-cols-[300px_minmax(0,1fr)] print:block print:px-0 print:pb-0">
      <SheetPlace {...{ schemeId, run, building, sheet, index }} onChoose={setChosen} />
      <SheetSection sheet={sheet} index={index} opened={opened} />
      <SheetAnswers {...{ run, building, sheet, opened }} />
      {can(scheme, 'readVisits') && (
        <div className="col-span-full mt-5">
          <VisitsOfBuilding schemeId={schemeId} buildingId={Number(building.facts.id)} />
        </div>
      )}
      <div className="col-span-full mt-5">
        <OwnersOfBuilding
          building={{
            id: Number(building.facts.id),
            reference: building.facts.reference,
            name: building.facts.name,
          }}
        />
      </div>
      {opened !== null && (
        <Panel
          title={`Working of wall ${opened.wall.name}`}
          note="each formula, the numbers put in, the source"
          className="col-span-full"
        >
          <WorkingList sections={opened.working} />
        </Panel>
      )}
    </div>
  );
}
