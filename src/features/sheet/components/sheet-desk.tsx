import { useMemo } from 'react';
import { sheetOfBuilding } from '../../../../shared/assessment/sheet-of-building.ts';
import type { RunBuilding, RunDetail } from '../../../../shared/schemas/runs.ts';
import { BasisLine } from '../../../components/layout/basis-line.tsx';
import { Content } from '../../../components/layout/content.tsx';
import { PageTitle } from '../../../components/layout/page-title.tsx';
import { formatMoment } from '../../../lib/format-date.ts';
import { useOnEveryPage } from '../../../hooks/use-on-every-page.ts';
import { designParts } from '../../../../shared/presentation/design-words.ts';
import { runName, staleWords } from '../../../../shared/presentation/run-words.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { SheetBody } from './sheet-body.tsx';
import { SheetHead } from './sheet-head.tsx';

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
  const { facts } = building;
  useOnEveryPage(
    [
      ...[`Sheet ${facts.reference}`, useScheme().name, run.option.name],
      ...[`${runName(run)}, ${formatMoment(run.startedAt)}`, `method ${run.methodVersion}`],
    ].join(' · '),
  );
  return (
    <>
      <PageTitle>{`Sheet ${facts.reference}`}</PageTitle>
      <div className="flex-none print:[--paper:#fff] print:[zoom:0.9]">
        <SheetBasis run={run} building={building} />
      </div>
      <Content>
        {/* A4 takes where it stands and its section on one page, with no letter under 6.5 pt */}
        <div className="print:[--paper:#fff] print:[--row:24px] print:[zoom:0.9]">
          <SheetHead {...{ schemeId, run, building }} />
          {/* what was opened of one building says nothing of the next */}
          <SheetBody key={facts.id} {...{ schemeId, run, building, sheet }} />
        </div>
      </Content>
    </>
  );
}
