import { CATEGORIES, type CategoryRow } from '../../../../shared/damage/categories.ts';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { Table } from '../../../components/ui/table/table.tsx';
import { percentFromRatio } from '../../../../shared/units/percent-from-ratio.ts';
import { formatSignificant } from '../../../../shared/presentation/significant.ts';
import { sourceNote } from '../../../../shared/presentation/source-note.ts';

function inPercent(strain: number): string {
  return `${formatSignificant(percentFromRatio(strain), 3)}\u00a0%`;
}

/** The strains between which a category lies. */
function limitsOf({ category, limitingStrain }: CategoryRow): string {
  const next = CATEGORIES[category + 1]?.limitingStrain;
  if (next === undefined) return `${inPercent(limitingStrain)} and more`;
  if (category === 0) return `under ${inPercent(next)}`;
  return `${inPercent(limitingStrain)} to under ${inPercent(next)}`;
}

const COLUMNS: readonly Column<CategoryRow>[] = [
  {
    id: 'category',
    heading: 'Category',
    cell: ({ category }) => <DamageChip category={category} named />,
  },
  { id: 'strain', heading: 'Largest tensile strain', cell: limitsOf },
  {
    id: 'repair',
    heading: 'What it takes to put right',
    cell: ({ repair }) => (
      <span className="block min-w-[260px] py-1.5 whitespace-normal">{repair}</span>
    ),
  },
];

/** The damage categories: hatch, limits and what repair they call for. */
export function DamageTable() {
  return (
    <>
      <Table
        label="Limits and repair by damage category"
        columns={COLUMNS}
        rows={CATEGORIES}
        idOf={({ label }) => label}
      />
      <p className="mt-2 max-w-[96ch] text-cap text-ink-2">
        Limits: {sourceNote('boscardin-cording-1989')}; {sourceNote('burland-1995')}. Names and ease
        of repair: {sourceNote('burland-broms-de-mello-1977')}, in words of our own. A strain on a
        limit belongs to the higher category.
      </p>
    </>
  );
}
