import { useState, type RefObject } from 'react';
import { useHotkeys } from '../../../hooks/use-hotkeys.ts';

type ActiveRow = {
  /** Index of the row that J and K have reached; −1 before the first. */
  readonly active: number;
  readonly activate: (index: number) => void;
};

type Rows = {
  readonly ids: readonly string[];
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

/** The row that the keys have reached: J and ↓ go on, K and ↑ go back. */
export function useActiveRow({ ids, enabled, scroller, reveal }: Rows): ActiveRow {
  const [activeId, setActiveId] = useState<string>();
  const active = activeId === undefined ? -1 : ids.indexOf(activeId);

  function move(step: number) {
    const index = active < 0 ? 0 : Math.min(ids.length - 1, Math.max(0, active + step));
    if (ids[index] === undefined) return;
    setActiveId(ids[index]);
    reveal(index);
    focusRow(scroller.current, index);
  }
  function moveInside(event: KeyboardEvent, step: number) {
    const { target } = event;
    if (target instanceof Node && scroller.current?.contains(target) === true) move(step);
  }
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
  return {
    active,
    activate: (index) => {
      setActiveId(ids[index]);
    },
  };
}
