import type { KeyboardEvent, MouseEvent, ReactNode, Ref } from 'react';
import { classNames } from '../../../lib/class-names.ts';
import { columnStyle, stuckStyle, type Column } from './column.ts';

type TableRowProps<T> = {
  /** Undefined while it is still being fetched. */
  readonly row: T | undefined;
  readonly columns: readonly Column<T>[];
  /** Counted from 0, without the headings. */
  readonly index: number;
  readonly isActive: boolean;
  readonly isInTabOrder: boolean;
  readonly onActivate: () => void;
  readonly onOpen: (() => void) | undefined;
  readonly detail: ReactNode;
  readonly bodyRef: Ref<HTMLTableSectionElement> | undefined;
};

const ACTIVE =
  'bg-select-wash [&>td:first-child]:shadow-[inset_4px_0_var(--select)] ' +
  'focus-visible:[&>td:first-child]:shadow-[inset_4px_0_var(--select),inset_0_2px_var(--focus),inset_0_-2px_var(--focus)]';
const PRESSED = 'a, button, input, select, label';

function isOwnPress(event: MouseEvent): boolean {
  const { target } = event;
  return target instanceof Element && target.closest(PRESSED) === null;
}

function Cells<T>({ row, columns }: Pick<TableRowProps<T>, 'row' | 'columns'>) {
  return columns.map((column) => (
    <td
      key={column.id}
      style={stuckStyle(column)}
      className={classNames(
        'h-row border-b border-hairline bg-inherit px-2 whitespace-nowrap max-sm:h-11',
        'first:sticky first:left-0 first:z-[1] print:whitespace-normal print:static!',
        column.stuckAt !== undefined && 'sticky z-[1]',
        columnStyle(column),
      )}
    >
      {row !== undefined && column.cell(row)}
    </td>
  ));
}

/** A row and, when it is opened, what stands under it. */
export function TableRow<T>(props: TableRowProps<T>) {
  const { columns, index, isActive, isInTabOrder, onActivate, onOpen, detail, bodyRef } = props;

  function openByKey(event: KeyboardEvent<HTMLTableRowElement>) {
    if (event.target !== event.currentTarget || onOpen === undefined) return;
    if (event.key !== 'Enter' && event.key.toLowerCase() !== 'o') return;
    event.preventDefault();
    onOpen();
  }
  function openByPress(event: MouseEvent<HTMLTableRowElement>) {
    if (isOwnPress(event)) onOpen?.();
  }
  return (
    <tbody ref={bodyRef} data-index={index} className="print:break-inside-avoid">
      <tr
        data-row={index}
        aria-rowindex={index + 2}
        aria-busy={props.row === undefined || undefined}
        tabIndex={onOpen === undefined ? undefined : isInTabOrder ? 0 : -1}
        onFocus={onActivate}
        onKeyDown={openByKey}
        onClick={onOpen === undefined ? undefined : openByPress}
        className={classNames(
          'outline-none focus-visible:[&>td]:shadow-[inset_0_2px_var(--focus),inset_0_-2px_var(--focus)]',
          isActive ? ACTIVE : 'bg-paper',
          onOpen !== undefined && 'cursor-pointer',
          onOpen !== undefined && !isActive && 'hover:bg-paper-sunk',
        )}
      >
        <Cells {...props} />
      </tr>
      {detail !== undefined && (
        <tr>
          <td
            colSpan={columns.length}
            className="border-b border-hairline bg-sheet px-(--edge) py-3"
          >
            {detail}
          </td>
        </tr>
      )}
    </tbody>
  );
}
