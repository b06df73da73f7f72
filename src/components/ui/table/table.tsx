import {
  getCoreRowModel,
  getSortedRowModel,
  useReactTable,
  type ColumnSort,
  type Row,
} from '@tanstack/react-table';
import { useMemo, useRef, type ReactNode } from 'react';
import { classNames } from '../../../lib/class-names.ts';
import { columnDef, type Column } from './column.ts';
import { TableHead } from './table-head.tsx';
import { TableRow } from './table-row.tsx';
import { useActiveRow } from './use-active-row.ts';
import { useVirtualRows } from './use-virtual-rows.ts';

type TableProps<T> = {
  /** Names the table for who cannot see its surroundings. */
  readonly label: string;
  readonly columns: readonly Column<T>[];
  readonly rows: readonly T[];
  readonly idOf: (row: T) => string;
  /** With it rows can be pressed, and walked by J and K and opened by Enter. */
  readonly onOpen?: (row: T) => void;
  /** What stands under an opened row. */
  readonly detailOf?: (row: T) => ReactNode;
  readonly sortedBy?: ColumnSort;
  /** Runs from edge to edge of the page; otherwise it keeps to the column it stands in. */
  readonly wide?: boolean;
  readonly className?: string;
};

const EDGE_TO_EDGE = '-mx-8 border-t border-rule [--edge:32px] max-sm:-mx-4 max-sm:[--edge:16px]';
const NO_ROWS: ColumnSort[] = [];

function Gap({ height, columns }: { readonly height: number; readonly columns: number }) {
  if (height <= 0) return null;
  return (
    <tbody aria-hidden="true">
      <tr>
        <td colSpan={columns} style={{ height }} />
      </tr>
    </tbody>
  );
}

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

function opener<T>(onOpen: ((row: T) => void) | undefined, row: T): (() => void) | undefined {
  return (
    onOpen &&
    (() => {
      onOpen(row);
    })
  );
}

/** Hairline rows, headings with their units at the foot of their cells, figures to the right. */
export function Table<T>(props: TableProps<T>) {
  const { label, columns, onOpen, detailOf, wide = false, className } = props;
  const scroller = useRef<HTMLDivElement>(null);
  const { model, sorted } = useSortedRows(props);
  const { indexes, above, below, measure, reveal } = useVirtualRows(sorted.length, scroller);
  const ids = useMemo(() => sorted.map(({ id }) => id), [sorted]);
  const { active, activate } = useActiveRow({
    ids,
    enabled: onOpen !== undefined,
    scroller,
    reveal,
  });

  function rowAt(index: number, row: Row<T>) {
    return (
      <TableRow
        key={row.id}
        row={row.original}
        columns={columns}
        index={index}
        isActive={index === active}
        isInTabOrder={index === Math.max(active, indexes[0] ?? 0)}
        onActivate={() => {
          activate(index);
        }}
        onOpen={opener(onOpen, row.original)}
        detail={detailOf?.(row.original)}
        bodyRef={measure}
      />
    );
  }
  return (
    <div
      ref={scroller}
      className={classNames(
        'relative overflow-auto',
        wide ? EDGE_TO_EDGE : '[--edge:0px]',
        className,
      )}
      {...(onOpen === undefined && { role: 'region', 'aria-label': label, tabIndex: 0 })}
    >
      <table
        aria-label={label}
        aria-rowcount={sorted.length + 1}
        className="w-full border-separate border-spacing-0 text-small"
      >
        <TableHead columns={columns} model={model} />
        <Gap height={above} columns={columns.length} />
        {indexes.map((index) => {
          const row = sorted[index];
          return row && rowAt(index, row);
        })}
        <Gap height={below} columns={columns.length} />
      </table>
    </div>
  );
}
