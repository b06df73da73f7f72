import type { Range } from '../../../../shared/numerics/range.ts';
import type { Column } from '../../../components/ui/table/column.ts';
import { millimetres } from '../section-words.ts';

export type WithSettlement = { readonly settlement: Range | null };

/** Low, central and high settlement; a dash where the method refuses. */
export const SETTLEMENT_COLUMNS: readonly Column<WithSettlement>[] = (
  ['low', 'central', 'high'] as const
).map((end) => ({
  id: end,
  heading: `Settlement, ${end}`,
  unit: 'mm',
  holds: 'figure',
  cell: ({ settlement }) => (settlement === null ? '–' : millimetres(settlement[end])),
}));

/** So many rows of a table are read at most. */
const ROWS = 41;

/** Every so many of what is drawn, one of them among these, so that a table of it can be read. */
export function thinned<T>(all: readonly T[], one = 0): readonly T[] {
  const step = Math.max(1, Math.ceil((all.length - 1) / (ROWS - 1)));
  return all.filter((_, k) => (k - one) % step === 0);
}
