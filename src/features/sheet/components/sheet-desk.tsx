import { useMemo, useState } from 'react';
import { openWall } from '../../../../shared/assessment/open-wall.ts';
import { sheetOfBuilding } from '../../../../shared/assessment/sheet-of-building.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { BasisLine } from '../../../components/layout/basis-line.tsx';
import { Content } from '../../../components/layout/content.tsx';
import { PageTitle } from '../../../components/layout/page-title.tsx';
import { Panel } from '../../../components/ui/panel.tsx';
import { formatMoment } from '../../../lib/format-date.ts';
import { designParts } from '../../alignments/design-words.ts';
import { WorkingList } from '../../assessment/components/working-list.tsx';
import { runName, staleWords } from '../../runs/run-words.ts';
import { SheetAnswers } from './sheet-answers.tsx';
import { SheetHead } from './sheet-head.tsx';
import { SheetPlace } from './sheet-place.tsx';
import { SheetSection } from './sheet-section.tsx';

type SheetDeskProps = {
  readonly schemeId: string;
  readonly run: RunDetail;
  readonly building: RunBuilding;
};

function useSheet(run: RunDetail, { facts, rows }: RunBuilding) {
  return useMemo(
    () => sheetOfBuilding(run.design, run.rules, facts, new Map([[facts.id, rows]])),
    [run, facts, rows],
  );
}

function SheetBasis({ run, building }: Pick<SheetDeskProps, 'run' | 'building'>) {
  const stale = staleWords(run, { ...run.since, register: building.changedSince });
  return (
    <BasisLine
      parts={[
        <b key="option">{run.option.name}</b>,
        `${runName(run)}, ${formatMoment(run.startedAt)}`,
        ...designParts(run.design),
        `Rules version ${run.rulesVersion}, method ${run.methodVersion}`,
        ...(stale === null ? [] : [<b key="stale">{stale}</b>]),
      ]}
      end={
        <>
          Figures shown at the <b>central</b> value
        </>
      }
    />
  );
}

/** One building in one run: where and what, what the ground does to it, what that means. */
export function SheetDesk({ schemeId, run, building }: SheetDeskProps) {
  const sheet = useSheet(run, building);
  const [chosen, setChosen] = useState<number>();
  const { strain, inputs } = sheet;
  const index = chosen ?? Math.max(0, strain?.governing ?? 0);
  const wall = strain?.walls[index]?.wall;
  const opened = useMemo(
    () => (wall === undefined ? null : openWall(inputs.model, wall, inputs.rules, [])),
    [inputs, wall],
  );
  const { facts } = building;
  return (
    <>
      <PageTitle>{`Sheet ${facts.reference}`}</PageTitle>
      <SheetBasis run={run} building={building} />
      <Content>
        <SheetHead {...{ schemeId, run, building }} />
        <div className="grid gap-x-8 px-8 pt-4 pb-8 max-sm:px-4 xl:grid-cols-[300px_minmax(0,1fr)_320px] lg:grid-cols-[300px_minmax(0,1fr)] print:block">
          <SheetPlace {...{ schemeId, run, building, sheet, index }} onChoose={setChosen} />
          <SheetSection sheet={sheet} index={index} opened={opened} />
          <SheetAnswers {...{ run, building, sheet, opened }} />
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
      </Content>
    </>
  );
}
