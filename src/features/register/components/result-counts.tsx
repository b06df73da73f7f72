import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import type { RegisterFilter } from '../../../../shared/schemas/register.ts';
import type { RunDetail } from '../../../../shared/schemas/runs.ts';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { HeldCounts } from '../../decisions/components/held-counts.tsx';
import { runName, staleWords } from '../../../../shared/presentation/run-words.ts';
import { registerOfResults } from '../register-of-results.ts';

type ResultCountsProps = {
  readonly schemeId: string;
  readonly run: RunDetail;
  readonly filter: RegisterFilter;
};

type CountLink = {
  readonly key: string;
  readonly found: RegisterFilter;
  readonly count: number;
  readonly children: ReactNode;
};

/** How many buildings the run that is shown found where; each number leads to them. */
export function ResultCounts({ schemeId, run, filter }: ResultCountsProps) {
  const { counts } = run;
  if (counts === null) return null;
  const categories = CATEGORIES.map(({ category }): CountLink => ({
    key: `category ${category}`,
    found: { any: { category: [String(category)] } },
    count: counts.central[category],
    children: <DamageChip category={category} />,
  }));
  const sensitive: CountLink = {
    key: 'sensitive',
    found: { any: { settled: ['sensitive'] } },
    count: counts.sensitive,
    children: 'Sensitive',
  };
  const asked = JSON.stringify(filter);
  const linkTo = ({ key, found, count, children }: CountLink) => (
    <Link
      key={key}
      to={registerOfResults(schemeId, found)}
      aria-current={JSON.stringify(found) === asked ? 'true' : undefined}
      className="inline-flex h-[26px] items-center gap-1.5 rounded px-2 hover:bg-paper-sunk aria-[current]:bg-sheet aria-[current]:font-semibold max-sm:h-9"
    >
      {children} <span className="text-ink-2">{formatCount(count)}</span>
    </Link>
  );
  const stale = staleWords(run, run.since);
  return (
    <nav
      aria-label={`What ${runName(run).toLowerCase()} found`}
      className="flex flex-wrap items-center gap-1 text-small whitespace-nowrap max-sm:flex-nowrap max-sm:overflow-x-auto"
    >
      <span className="mr-2 text-ink-2" title={stale ?? undefined}>
        {stale ?? `${runName(run)}, ${run.option.name}`}
      </span>
      <span className="text-ink-2">Category, central</span>
      {categories.map(linkTo)}
      {linkTo(sensitive)}
      <HeldCounts schemeId={schemeId} runId={run.id} />
    </nav>
  );
}
