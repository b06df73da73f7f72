import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { PartyImport } from '../../../../shared/schemas/party-imports.ts';
import { classNames } from '../../../lib/class-names.ts';
import type { RowsOnly } from '../api/party-imports.ts';

const FIGURES: readonly { readonly only: RowsOnly; readonly words: string }[] = [
  { only: 'new party', words: 'new parties' },
  { only: 'new interest', words: 'more interests' },
  { only: 'there already', words: 'there already' },
  { only: 'problem', words: 'with a problem' },
  { only: 'noted', words: 'with remarks' },
];

type PartyImportCountsProps = {
  readonly counts: PartyImport['counts'];
  readonly only: RowsOnly | null;
  readonly onChoose: (only: RowsOnly | null) => void;
};

/** How many rows come to what; each figure narrows the report to its rows, and widens it again. */
export function PartyImportCounts({ counts, only: chosen, onChoose }: PartyImportCountsProps) {
  return (
    <div
      role="group"
      aria-label="Show rows that are"
      className="-mx-2 flex flex-wrap gap-x-2 max-sm:grid max-sm:grid-cols-3"
    >
      {FIGURES.map(({ only, words }) => (
        <button
          key={only}
          type="button"
          aria-pressed={chosen === only}
          onClick={() => {
            onChoose(chosen === only ? null : only);
          }}
          className={classNames(
            'flex min-h-touch min-w-[86px] flex-col items-start border-b-[3px] px-2 py-1 text-left hover:bg-paper-sunk',
            chosen === only ? 'border-clay' : 'border-transparent',
          )}
        >
          <span
            className={classNames(
              'text-count leading-tight font-bold',
              counts[only] === 0 && 'text-ink-3',
              only === 'problem' && counts.problem > 0 && 'text-clay-deep',
            )}
          >
            {formatCount(counts[only])}
          </span>{' '}
          <span className="text-small text-ink-2">{words}</span>
        </button>
      ))}
    </div>
  );
}
