import { stacked, wordsPart, type ColumnPart, type ColumnPen } from './column-part.ts';
import type { SheetLayout } from './paper-sizes.ts';

/** How high a list in the column may be, as a share of it. */
const LIST_SHARE = 0.25;

/**
 * Where the list of what had no room in a drawing goes: a short one into the column, a long one behind the sheet
 * with a pointer to it in the column. `behind` adds it to what found no room in the column.
 *
 * Units: none. Valid: parts in the order of the column. Source: [own].
 */
export type ListInColumn = {
  readonly inColumn: readonly ColumnPart[];
  readonly behind: (left: readonly ColumnPart[]) => ColumnPart[];
};

/**
 * Finds the place of a list; one without parts takes none.
 *
 * Units: mm. Valid: parts made with that pen. Source: [own].
 */
export function listInColumn(
  pen: ColumnPen,
  { column }: SheetLayout,
  list: readonly ColumnPart[],
  pointer: string,
): ListInColumn {
  if (list.length === 0) return { inColumn: [], behind: (left) => [...left] };
  const whole = stacked(list);
  if (whole.height <= LIST_SHARE * (column.bottom - column.top)) {
    return { inColumn: [whole], behind: (left) => [...left] };
  }
  const words = wordsPart(pen, pointer, { size: 7.5 });
  return {
    inColumn: [words],
    behind: (left) => [...left.filter((part) => part !== words), ...list],
  };
}
