import type { Table as TableModel } from '@tanstack/react-table';

/** How rows are ordered, and how that is changed. */
export type Ordering = {
  readonly canSort: (columnId: string) => boolean;
  readonly directionOf: (columnId: string) => 'asc' | 'desc' | undefined;
  readonly sortBy: (columnId: string) => void;
};

/** The order that the table library keeps. */
export function orderingOf<T>(model: TableModel<T>): Ordering {
  return {
    canSort: (columnId) => model.getColumn(columnId)?.getCanSort() === true,
    directionOf: (columnId) => {
      const direction = model.getColumn(columnId)?.getIsSorted();
      return direction === false ? undefined : direction;
    },
    sortBy: (columnId) => {
      model.getColumn(columnId)?.toggleSorting();
    },
  };
}
