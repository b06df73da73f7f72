import {
  REGISTER_COLUMNS,
  type RegisterColumn,
  type RegisterSort,
} from '../../../shared/schemas/register.ts';
import type { Ordering } from '../../components/ui/table/ordering.ts';

/** What a column of the table is ordered by; a building by its address, as few have a name. */
function sortedColumn(columnId: string): RegisterColumn | undefined {
  if (columnId === 'building') return 'address';
  return REGISTER_COLUMNS.find((column) => column === columnId);
}

/** The order of the register, which the server keeps: a second press on a heading turns it round. */
export function registerOrdering(
  sort: RegisterSort,
  onSort: (sort: RegisterSort) => void,
): Ordering {
  return {
    canSort: (columnId) => sortedColumn(columnId) !== undefined,
    directionOf: (columnId) => {
      if (sortedColumn(columnId) !== sort.column) return undefined;
      return sort.descending ? 'desc' : 'asc';
    },
    sortBy: (columnId) => {
      const column = sortedColumn(columnId);
      if (column === undefined) return;
      onSort({ column, descending: column === sort.column && !sort.descending });
    },
  };
}
