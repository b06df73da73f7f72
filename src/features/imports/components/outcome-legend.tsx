import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { OUTCOMES_IN_ORDER, OUTCOME_WORDS } from '../outcomes.ts';
import { OutcomeSwatch } from './outcome-swatch.tsx';

/** What the outlines on the map mean, and how many there are of each. */
export function OutcomeLegend({
  counts,
}: {
  readonly counts: NonNullable<ImportAnswer['counts']>;
}) {
  const shown = OUTCOMES_IN_ORDER.filter((outcome) => counts[outcome] > 0);
  return (
    <dl
      aria-label="What the outlines mean"
      className="grid grid-cols-[auto_1fr_auto] items-center gap-x-2 gap-y-1 rounded border border-rule bg-paper-raised px-3 py-2 text-small shadow-lift max-md:flex max-md:flex-wrap max-md:gap-x-4"
    >
      {shown.map((outcome) => (
        <div
          key={outcome}
          className="col-span-3 grid grid-cols-subgrid items-center max-md:flex max-md:gap-1.5"
        >
          <dt className="col-span-2 grid grid-cols-subgrid items-center max-md:flex max-md:gap-1.5">
            <OutcomeSwatch outcome={outcome} />
            {OUTCOME_WORDS[outcome].one}
          </dt>
          <dd className="pl-3 text-right max-md:pl-0">{formatCount(counts[outcome])}</dd>
        </div>
      ))}
    </dl>
  );
}
