import type { ColumnDef } from '@tanstack/react-table';
import type { ReactNode } from 'react';

/** A column of a table. */
export type Column<T> = {
  readonly id: string;
  readonly heading: string;
  /** Stands under the heading, never in the rows. */
  readonly unit?: string;
  /** A figure: set to the right. */
  readonly figure?: boolean;
  /** May be left out where the screen is narrow. */
  readonly spare?: boolean;
  /** Takes what room the others leave. */
  readonly wide?: boolean;
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
export function columnStyle<T>({ figure, spare, wide }: Column<T>): string {
  return [
    figure === true ? 'text-right' : 'text-left',
    spare === true ? 'max-sm:hidden' : '',
    wide === true ? 'w-full' : '',
  ].join(' ');
}
