import type { CheckRow } from '../../../../shared/checks/check.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { NARROW, useMedia } from '../../../hooks/use-media.ts';
import { sourceNote } from '../../../../shared/presentation/source-note.ts';
import { sourceInFull } from '../../../../shared/presentation/source-words.ts';
import {
  computedFigure,
  differenceFigure,
  publishedFigure,
  toleranceFigure,
} from '../checks/check-figures.ts';
import { agreement, type CheckDone } from '../checks/run-checks.ts';
import { Verdict } from './verdict.tsx';

const COLUMNS: readonly Column<CheckRow>[] = [
  {
    id: 'what',
    heading: 'What',
    wide: true,
    width: 250,
    cell: ({ what }) => <span title={what}>{what}</span>,
  },
  { id: 'computed', heading: 'Computed', holds: 'figure', width: 160, cell: computedFigure },
  { id: 'published', heading: 'Published', holds: 'figure', width: 160, cell: publishedFigure },
  { id: 'unit', heading: 'Unit', width: 80, cell: ({ unit }) => unit },
  { id: 'difference', heading: 'Difference', holds: 'figure', width: 110, cell: differenceFigure },
  { id: 'tolerance', heading: 'Tolerance', holds: 'figure', width: 100, cell: toleranceFigure },
  {
    id: 'verdict',
    heading: 'Verdict',
    width: 100,
    cell: ({ agrees }) => <Verdict agrees={agrees} />,
  },
];

const ON_A_PHONE = ['what', 'computed', 'published', 'verdict'];

/** What there is room for on a phone, as wide as it happens to be. */
const FEW_COLUMNS: readonly Column<CheckRow>[] = COLUMNS.filter(({ id }) =>
  ON_A_PHONE.includes(id),
).map(({ id, heading, holds, cell }) => ({
  id,
  heading,
  ...(holds !== undefined && { holds }),
  cell: (row) =>
    id === 'what' ? (
      <span className="block whitespace-normal">
        {row.what}
        {row.unit !== '' && `, ${row.unit}`}
      </span>
    ) : (
      cell(row)
    ),
}));

/** One check: what it holds against what, figure by figure. */
export function CheckTable({ check }: { readonly check: CheckDone }) {
  const { id, name, source, provenance, rows } = check;
  const { agreeing, all } = agreement([check]);
  const columns = useMedia(NARROW) ? FEW_COLUMNS : COLUMNS;
  return (
    <div id={`check-${id}`} className="mt-4 scroll-mt-4">
      <div className="flex flex-wrap items-baseline gap-x-3">
        <h3 className="text-body">{name}</h3>
        <span className="ml-auto flex items-baseline gap-2 text-small text-ink-2">
          {agreeing} of {all} agree
          <Verdict agrees={agreeing === all} />
        </span>
      </div>
      <p className="mb-1 max-w-[96ch] text-cap text-ink-2">
        <span title={sourceInFull(source)}>{sourceNote(source)}</span>. {provenance}.
      </p>
      <Table label={name} columns={columns} rows={rows} idOf={({ what }) => what} />
    </div>
  );
}
