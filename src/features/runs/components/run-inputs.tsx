import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { RunDetail } from '../../../../shared/schemas/runs.ts';
import { Facts } from '../../../components/ui/facts.tsx';
import { Popover } from '../../../components/ui/popover.tsx';
import { settingsPath } from '../../../config/paths.ts';
import { formatMoment } from '../../../lib/format-date.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { designLines } from '../../alignments/option-changes.ts';
import { runName } from '../../../../shared/presentation/run-words.ts';
import { RunCountsTable } from './run-counts.tsx';

type RunInputsProps = { readonly schemeId: string; readonly run: RunDetail };

type Fact = readonly [word: string, value: ReactNode];

function inputs(schemeId: string, run: RunDetail): readonly Fact[] {
  const by = run.startedBy === null ? '' : ` by ${run.startedBy}`;
  return [
    [
      'Rules',
      <Link key="rules" to={settingsPath(schemeId, 'rules')}>
        Version {run.rulesVersion}
      </Link>,
    ],
    ['Method', `Version ${run.methodVersion}`],
    ['Register', `Version ${run.registerVersion}, ${formatCount(run.buildings)} buildings`],
    ['Started', `${formatMoment(run.startedAt)}${by}`],
  ];
}

function found({ counts, option }: RunDetail): readonly Fact[] {
  return [
    ...(counts === null ? [] : [['Stages', stageWords(counts.stages)] as const]),
    ['Option', `${option.name}, version ${option.version}`],
  ];
}

function stageWords([first, second, third]: NonNullable<RunDetail['counts']>['stages']): string {
  const counts = [first, second, third].map(formatCount);
  return `${counts[0]} let go at stage 1, ${counts[1]} at stage 2, ${counts[2]} at stage 3`;
}

function Inputs({ schemeId, run }: RunInputsProps) {
  const { counts } = run;
  return (
    <div className="w-[380px] max-w-full">
      <h2 className="mb-1 text-lead">{runName(run)}</h2>
      {counts !== null && (
        <div className="mb-2">
          <RunCountsTable counts={counts} />
        </div>
      )}
      <Facts facts={[...found(run), ...designLines(run.design), ...inputs(schemeId, run)]} />
    </div>
  );
}

/** What a run went by and what it found, under a button. */
export function RunInputs({ schemeId, run }: RunInputsProps) {
  return (
    <Popover
      wide
      name={`What ${runName(run).toLowerCase()} rests on`}
      button="Inputs"
      buttonClassName="-my-1 min-h-6 underline underline-offset-2 hover:text-ink max-sm:min-h-11"
    >
      <Inputs {...{ schemeId, run }} />
    </Popover>
  );
}
