import type { RegisterRow } from '../../../../shared/schemas/register.ts';
import type { StandingColumn } from '../../../../shared/schemas/standing-columns.ts';
import { capital } from '../../../../shared/presentation/capital.ts';
import { StateMark } from '../../../components/ui/state-mark.tsx';
import { isStanding, STANDING_MARKS } from '../standing-words.ts';

type StandingCellProps = { readonly column: StandingColumn; readonly row: RegisterRow };

/** Where a building stands on the assessors' list, in one column. */
export function StandingCell({ column, row }: StandingCellProps) {
  const value = row[column];
  if (value === null) return null;
  if (column === 'state' && isStanding(value)) {
    const { shape, words } = STANDING_MARKS[value];
    return <StateMark state={shape}>{words}</StateMark>;
  }
  const text = capital(value);
  return <span title={text}>{text}</span>;
}
