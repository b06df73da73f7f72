import { CATEGORIES, type Category } from '../../../../shared/damage/categories.ts';
import type { RunCounts } from '../../../../shared/schemas/runs.ts';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { ENDS } from '../shades-of-run.ts';

type Row = { readonly category: Category; readonly counts: RunCounts };

const COLUMNS: readonly Column<Row>[] = [
  {
    id: 'category',
    heading: 'Category',
    cell: ({ category }) => <DamageChip category={category} />,
  },
  ...ENDS.map((end): Column<Row> => ({
    id: end,
    heading: end.charAt(0).toUpperCase() + end.slice(1),
    holds: 'figure',
    cell: ({ category, counts }) => formatCount(counts[end][category]),
  })),
];

/** How many buildings a run found in each category over the likely range. */
export function RunCountsTable({ counts }: { readonly counts: RunCounts }) {
  return (
    <Table
      label="Buildings by category"
      columns={COLUMNS}
      rows={CATEGORIES.map(({ category }) => ({ category, counts }))}
      idOf={({ category }) => String(category)}
    />
  );
}
