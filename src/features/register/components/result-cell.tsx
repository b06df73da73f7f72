import { CATEGORIES } from '../../../../shared/damage/categories.ts';
import type { RegisterRow } from '../../../../shared/schemas/register.ts';
import type { ResultColumn } from '../../../../shared/schemas/result-columns.ts';
import { DamageChip } from '../../../components/ui/damage-chip.tsx';
import { resultText } from '../../../../shared/presentation/result-text.ts';

/** Why there is no figure. */
function noneWords({ stage }: RegisterRow): string {
  return stage === null ? 'not in the run' : `none: let go at stage ${stage}, or not worked out`;
}

/** What the run found of a building in one column. */
export function ResultCell({
  column,
  row,
}: {
  readonly column: ResultColumn;
  readonly row: RegisterRow;
}) {
  const value = row[column];
  if (column === 'heldBy' && value === null && row.stage !== null) return null;
  if (value === null) {
    return (
      <span title={noneWords(row)} className="text-ink-3">
        <span aria-hidden="true">–</span>
        <span className="sr-only">{noneWords(row)}</span>
      </span>
    );
  }
  const found = CATEGORIES.find(({ category }) => category === value);
  if (column.startsWith('category') && found !== undefined) {
    return <DamageChip category={found.category} />;
  }
  const text = resultText(column, value);
  return <span title={text}>{text}</span>;
}
