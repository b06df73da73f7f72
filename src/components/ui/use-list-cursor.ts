import { useState, type KeyboardEvent } from 'react';

type ListCursor = {
  readonly cursor: number;
  readonly moveTo: (index: number) => void;
  readonly onKeyDown: (event: KeyboardEvent) => void;
};

/** Which of some options the arrow keys have reached; Enter takes it. */
export function useListCursor(count: number, take: (index: number) => void): ListCursor {
  const [reached, setReached] = useState(0);
  const cursor = Math.min(reached, Math.max(0, count - 1));

  function onKeyDown(event: KeyboardEvent) {
    const steps: Readonly<Record<string, number>> = { ArrowDown: 1, ArrowUp: -1 };
    const step = steps[event.key];
    if (step !== undefined && count > 0) {
      event.preventDefault();
      setReached((cursor + step + count) % count);
    }
    if (event.key === 'Enter') {
      event.preventDefault();
      if (count > 0) take(cursor);
    }
  }
  return { cursor, moveTo: setReached, onKeyDown };
}
