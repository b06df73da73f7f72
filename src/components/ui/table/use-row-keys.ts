import type { RefObject } from 'react';
import type { KeyHelp } from '../../../config/keys-at-hand.ts';
import { useHotkeys } from '../../../hooks/use-hotkeys.ts';
import { useKeyHelp } from '../../../hooks/use-key-help.ts';

const ROW_KEYS: readonly KeyHelp[] = [
  { keys: ['J', 'K'], does: 'Next and previous row of a table' },
  { keys: ['Enter', 'O'], does: 'Open the row' },
];

type Rows = {
  readonly count: number;
  /** Index of the row that J and K have reached; −1 before the first. */
  readonly active: number;
  readonly onActivate: (index: number) => void;
  readonly enabled: boolean;
  readonly scroller: RefObject<HTMLDivElement | null>;
  readonly reveal: (index: number) => void;
};

function focusRow(scroller: HTMLDivElement | null, index: number, tries = 5): void {
  const row = scroller?.querySelector<HTMLElement>(`[data-row="${index}"]`);
  if (row !== null && row !== undefined) row.focus();
  // a row far away comes into the page only once the table has scrolled
  else if (tries > 0) {
    requestAnimationFrame(() => {
      focusRow(scroller, index, tries - 1);
    });
  }
}

/** J and ↓ go on to the next row, K and ↑ back. */
export function useRowKeys({ count, active, onActivate, enabled, scroller, reveal }: Rows): void {
  function move(step: number) {
    if (count === 0) return;
    const index = active < 0 ? 0 : Math.min(count - 1, Math.max(0, active + step));
    onActivate(index);
    reveal(index);
    focusRow(scroller.current, index);
  }
  function moveInside(event: KeyboardEvent, step: number) {
    const { target } = event;
    if (target instanceof Node && scroller.current?.contains(target) === true) move(step);
  }
  useKeyHelp(ROW_KEYS, enabled && count > 0);
  useHotkeys(
    {
      j: () => {
        move(1);
      },
      k: () => {
        move(-1);
      },
    },
    enabled,
  );
  useHotkeys(
    {
      ArrowDown: (event) => {
        moveInside(event, 1);
      },
      ArrowUp: (event) => {
        moveInside(event, -1);
      },
    },
    enabled && active >= 0,
  );
}
