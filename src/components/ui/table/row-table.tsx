import { useRef, type ReactNode } from 'react';
import { classNames } from '../../../lib/class-names.ts';
import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { Column } from './column.ts';
import type { Ordering } from './ordering.ts';
import { MoreAtSides } from './more-at-sides.tsx';
import { TableFrame } from './table-frame.tsx';
import { TableRow } from './table-row.tsx';
import { useRevealed } from './use-revealed.ts';
import { useRowKeys } from './use-row-keys.ts';
import { useVirtualRows } from './use-virtual-rows.ts';

/** Rows by their place, of which some may still be on their way. */
export type RowTableProps<T> = {
  /** Names the table for who cannot see its surroundings. */
  readonly label: string;
  readonly columns: readonly Column<T>[];
  readonly count: number;
  /** Undefined while it is being fetched: the row then shows its hairline only. */
  readonly rowAt: (index: number) => T | undefined;
  readonly idOf: (row: T) => string;
  readonly ordering: Ordering;
  /** Index of the row that has been reached, by J and K or from outside; −1 for none. */
  readonly active: number;
  readonly onActivate: (index: number) => void;
  /** With it rows can be pressed, and walked by J and K and opened by Enter. */
  readonly onOpen?: ((row: T) => void) | undefined;
  /** What stands under an opened row. */
  readonly detailOf?: ((row: T) => ReactNode) | undefined;
  /** Told which rows are in the page, for who has to fetch them. */
  readonly onView?: ((first: number, last: number) => void) | undefined;
  /** With other rows under the same places, such as in another order, the table starts at its top. */
  readonly startsAnewWith?: string | undefined;
  readonly className?: string | undefined;
};

/** Hairline rows, headings with their units at the foot of their cells, figures to the right. */
export function RowTable<T>(props: RowTableProps<T>) {
  const { label, columns, count, rowAt, idOf, active, onActivate, onOpen, detailOf } = props;
  const scroller = useRef<HTMLDivElement>(null);
  const rows = useVirtualRows(count, scroller, props.onView);
  const { indexes, reveal } = rows;
  const enabled = onOpen !== undefined;
  useRowKeys({ count, active, onActivate, enabled, scroller, reveal });
  useRevealed({ active, startsAnewWith: props.startsAnewWith, scroller, reveal });

  function drawRow(index: number) {
    const row = rowAt(index);
    return (
      <TableRow
        key={row === undefined ? index : idOf(row)}
        row={row}
        columns={columns}
        index={index}
        isActive={index === active}
        isInTabOrder={index === Math.max(active, indexes[0] ?? 0)}
        onActivate={() => {
          onActivate(index);
        }}
        onOpen={
          onOpen &&
          (() => {
            if (row !== undefined) onOpen(row);
          })
        }
        detail={row && detailOf?.(row)}
        bodyRef={rows.measure}
      />
    );
  }
  return (
    <div
      className={classNames(
        'relative flex min-w-0 flex-col print:block print:max-h-none!',
        props.className,
      )}
    >
      <div
        ref={scroller}
        className="relative min-h-0 overflow-auto print:overflow-visible"
        {...(!enabled && { role: 'region', 'aria-label': label, tabIndex: 0 })}
      >
        <TableFrame {...{ label, columns, count }} ordering={props.ordering} gaps={rows}>
          {indexes.map(drawRow)}
        </TableFrame>
        {rows.unprinted > 0 && (
          <p className="mt-2 px-(--edge) text-small">
            The first {formatCount(indexes.length)} rows are printed. Left out:{' '}
            {formatCount(rows.unprinted)}.
          </p>
        )}
      </div>
      <MoreAtSides scroller={scroller} />
    </div>
  );
}
