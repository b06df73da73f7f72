import type { ColumnDef } from '@tanstack/react-table';
import type { ReactNode } from 'react';
import { classNames } from '../../../lib/class-names.ts';

/** A column of a table. */
export type Column<T> = {
  readonly id: string;
  readonly heading: ReactNode;
  /** Stands under the heading, never in the rows. */
  readonly unit?: string;
  /** A figure is set to the right, a tick in the middle, words to the left. */
  readonly holds?: 'figure' | 'tick';
  /** May be left out where the screen is narrow. */
  readonly spare?: boolean;
  /** Takes what room the others leave; what it holds is cut short where that is little. */
  readonly wide?: boolean;
  /** In pixels. Where every column has one, none of them moves as rows come. */
  readonly width?: number;
  /** Stays in view, so far from the left, while the rest is scrolled sideways; the first always stays. */
  readonly stuckAt?: number;
  /** What the column is sorted by; without it, it is not. */
  readonly sortBy?: (row: T) => string | number;
  readonly cell: (row: T) => ReactNode;
};

/** The column as the table library knows it. */
export function columnDef<T>({ id, sortBy }: Column<T>): ColumnDef<T> {
  if (sortBy === undefined) return { id, enableSorting: false };
  return { id, accessorFn: sortBy, sortingFn: 'alphanumeric', sortDescFirst: false };
}

/** The look of a column's cells, heading and rows alike. */
export function columnStyle<T>({ holds, spare, wide, width }: Column<T>): string {
  const align = { figure: 'text-right', tick: 'text-center', words: 'text-left' }[holds ?? 'words'];
  return classNames(
    align,
    'first:pl-(--edge) last:pr-(--edge)',
    spare === true && 'max-sm:hidden',
    wide === true && 'w-full max-w-0 min-w-[140px]',
    (wide === true || width !== undefined) && 'truncate',
  );
}

/** Where a column stays while the rest is scrolled sideways. */
export function stuckStyle<T>({ stuckAt }: Column<T>): { left: number } | undefined {
  return stuckAt === undefined ? undefined : { left: stuckAt };
}
