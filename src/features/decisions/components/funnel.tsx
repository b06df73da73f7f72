import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { STANDINGS } from '../../../../shared/schemas/decisions.ts';
import type { Funnel as FunnelAnswer } from '../../../../shared/schemas/decision-answers.ts';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { StateShape } from '../../../components/ui/state-mark.tsx';
import { registerOfResults } from '../../register/register-of-results.ts';
import { funnelQuery } from '../api/get-funnel.ts';
import { STANDING_MARKS } from '../standing-words.ts';

type FunnelProps = {
  readonly schemeId: string;
  readonly runId: string;
  readonly filter: RegisterFilter;
};

const STAGES = [
  { stage: 1, words: 'Stage 1, screening' },
  { stage: 2, words: 'Stage 2, strain' },
  { stage: 3, words: 'Stage 3, detailed' },
] as const;

/** Pixels of a bar that stands for all buildings of the run, and of the thinnest. */
const THICKEST = 20;
const THINNEST = 2;

function thickness(count: number, all: number): number {
  return all === 0 || count === 0 ? THINNEST : Math.max(THINNEST, (THICKEST * count) / all);
}

type StepProps = FunnelProps & {
  readonly words: string;
  readonly stage: 1 | 2 | 3;
  readonly counts: FunnelAnswer['stages'][number];
  readonly all: number;
};

function Step({ schemeId, filter, words, stage, counts, all }: StepProps) {
  const found = { stage: [String(stage)] };
  const isHere = JSON.stringify(filter.any?.stage) === JSON.stringify(found.stage);
  const states = STANDINGS.filter((standing) => counts.standings[standing] > 0);
  return (
    <li className="min-w-[210px] flex-1">
      <Link
        to={registerOfResults(schemeId, { any: found })}
        aria-current={isHere ? 'true' : undefined}
        className="inline-flex items-baseline gap-2 border-b-2 border-transparent text-ink no-underline hover:border-rule aria-[current]:border-clay"
      >
        <span className="text-h3 font-bold tabular-nums">{formatCount(counts.buildings)}</span>
        <span className="text-small font-semibold">{words}</span>
      </Link>
      <div aria-hidden="true" className="flex h-5 items-center">
        <div
          className="w-full bg-ink-3/60"
          style={{ height: `${thickness(counts.buildings, all)}px` }}
        />
      </div>
      <p className="flex flex-wrap gap-x-2.5 gap-y-0.5 text-cap text-ink-2">
        {states.map((standing) => (
          <Link
            key={standing}
            to={registerOfResults(schemeId, { any: { ...found, state: [standing] } })}
            className="inline-flex min-h-6 items-center gap-1 text-ink-2 no-underline hover:underline"
          >
            <StateShape state={STANDING_MARKS[standing].shape} />
            <b className="font-semibold text-ink">{formatCount(counts.standings[standing])}</b>{' '}
            {STANDING_MARKS[standing].words.toLowerCase()}
          </Link>
        ))}
      </p>
    </li>
  );
}

/** How many buildings stand at each stage and in each state; every number leads to them. */
export function Funnel(props: FunnelProps) {
  const { schemeId, runId } = props;
  const { data } = useQuery(funnelQuery(schemeId, runId));
  return (
    <nav aria-label="Stages and states" className="min-h-[74px] overflow-x-auto">
      {data !== undefined && (
        <ol className="flex gap-x-6">
          {STAGES.map(({ stage, words }) => (
            <Step
              key={stage}
              {...{ ...props, stage, words }}
              counts={data.stages[stage - 1] ?? data.stages[0]}
              all={data.buildings}
            />
          ))}
        </ol>
      )}
    </nav>
  );
}
