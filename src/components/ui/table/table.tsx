import {
  getCoreRowModel,
  getSortedRowModel,
  useReactTable,
  type ColumnSort,
} from '@tanstack/react-table';
import { useMemo, useState } from 'react';
import { classNames } from '../../../lib/class-names.ts';
import { columnDef } from './column.ts';
import { orderingOf } from './ordering.ts';
import { RowTable, type RowTableProps } from './row-table.tsx';

type TableProps<T> = Pick<
  RowTableProps<T>,
  'label' | 'columns' | 'idOf' | 'onOpen' | 'detailOf' | 'className'
> & {
  readonly rows: readonly T[];
  readonly sortedBy?: ColumnSort;
  /** Runs from edge to edge of the page; otherwise it keeps to the column it stands in. */
  readonly wide?: boolean;
};

const EDGE_TO_EDGE = '-mx-8 border-t border-rule [--edge:32px] max-sm:-mx-4 max-sm:[--edge:16px]';
const NO_ROWS: ColumnSort[] = [];

function useSortedRows<T>({ columns, rows, idOf, sortedBy }: TableProps<T>) {
  const data = useMemo(() => [...rows], [rows]);
  const definitions = useMemo(() => columns.map(columnDef), [columns]);
  const model = useReactTable({
    data,
    columns: definitions,
    getRowId: idOf,
    getCoreRowModel: getCoreRowModel(),
    getSortedRowModel: getSortedRowModel(),
    initialState: { sorting: sortedBy === undefined ? NO_ROWS : [sortedBy] },
  });
  return { model, sorted: model.getRowModel().rows };
}

/** A table of rows that are all at hand; it orders them itself. */
export function Table<T>(props: TableProps<T>) {
  const { label, columns, idOf, onOpen, detailOf, wide = false, className } = props;
  const { model, sorted } = useSortedRows(props);
  const [activeId, setActiveId] = useState<string>();
  return (
    <RowTable
      {...{ label, columns, idOf, onOpen, detailOf }}
      count={sorted.length}
      rowAt={(index) => sorted[index]?.original}
      ordering={orderingOf(model)}
      active={activeId === undefined ? -1 : sorted.findIndex(({ id }) => id === activeId)}
      onActivate={(index) => {
        setActiveId(sorted[index]?.id);
      }}
      className={classNames(wide ? EDGE_TO_EDGE : '[--edge:0px]', className)}
    />
  );
}
