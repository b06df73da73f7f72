import type { ReactNode } from 'react';
import { classNames } from '../../../lib/class-names.ts';
import type { Column } from './column.ts';
import type { Ordering } from './ordering.ts';
import { TableHead } from './table-head.tsx';

type TableFrameProps<T> = {
  readonly label: string;
  readonly columns: readonly Column<T>[];
  readonly count: number;
  readonly ordering: Ordering;
  /** Heights of the rows that are left out above and below. */
  readonly gaps: { readonly above: number; readonly below: number };
  readonly children: ReactNode;
};

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

/** Keeps every column as wide as it says; the wide one takes what is left over. */
function FixedWidths<T>({ columns }: { readonly columns: readonly Column<T>[] }) {
  return (
    <colgroup>
      {columns.map(({ id, width, wide }) => (
        <col key={id} style={wide === true ? undefined : { width }} />
      ))}
    </colgroup>
  );
}

/** The table round its rows: headings, widths, and the room of what is left out. */
export function TableFrame<T>(props: TableFrameProps<T>) {
  const { label, columns, count, ordering, gaps, children } = props;
  const widths = columns.map(({ width }) => width ?? 0);
  const isFixed = !widths.includes(0);
  return (
    <table
      aria-label={label}
      aria-rowcount={count + 1}
      className={classNames(
        'w-full border-separate border-spacing-0 text-small',
        isFixed && 'table-fixed',
      )}
      style={isFixed ? { minWidth: widths.reduce((sum, width) => sum + width, 0) } : undefined}
    >
      {isFixed && <FixedWidths columns={columns} />}
      <TableHead columns={columns} ordering={ordering} />
      <Gap height={gaps.above} columns={columns.length} />
      {children}
      <Gap height={gaps.below} columns={columns.length} />
    </table>
  );
}
