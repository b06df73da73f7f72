import type { ImportAnswer } from '../../../../shared/schemas/imports.ts';
import { classNames } from '../../../lib/class-names.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { OUTCOMES_IN_ORDER, OUTCOME_WORDS, type RowFilter } from '../outcomes.ts';
import { OutcomeSwatch } from './outcome-swatch.tsx';

type OutcomeCountsProps = {
  readonly counts: NonNullable<ImportAnswer['counts']>;
  readonly chosen: RowFilter | null;
  readonly onChoose: (filter: RowFilter | null) => void;
};

type OneCountProps = {
  readonly filter: RowFilter;
  readonly count: number;
  readonly isChosen: boolean;
  readonly onPress: () => void;
};

function OneCount({ filter, count, isChosen, onPress }: OneCountProps) {
  return (
    <button
      type="button"
      aria-pressed={isChosen}
      onClick={onPress}
      className={classNames(
        'flex min-h-touch min-w-[86px] flex-col items-start border-b-[3px] px-2 py-1 text-left hover:bg-paper-sunk',
        isChosen ? 'border-clay' : 'border-transparent',
      )}
    >
      <span
        className={classNames('text-count font-bold leading-tight', count === 0 && 'text-ink-3')}
      >
        {formatCount(count)}
      </span>{' '}
      <span className="flex items-center gap-1.5 text-small text-ink-2">
        {filter !== 'noted' && <OutcomeSwatch outcome={filter} />}
        {OUTCOME_WORDS[filter].many}
      </span>
    </button>
  );
}

/** How many rows come to what; each figure narrows the report to its rows, and widens it again. */
export function OutcomeCounts({ counts, chosen, onChoose }: OutcomeCountsProps) {
  const filters: readonly RowFilter[] = [...OUTCOMES_IN_ORDER, 'noted'];
  return (
    <div
      role="group"
      aria-label="Show rows that are"
      className="-mx-2 flex flex-wrap gap-x-2 max-sm:grid max-sm:grid-cols-3"
    >
      {filters.map((filter) => (
        <OneCount
          key={filter}
          filter={filter}
          count={counts[filter]}
          isChosen={chosen === filter}
          onPress={() => {
            onChoose(chosen === filter ? null : filter);
          }}
        />
      ))}
    </div>
  );
}
