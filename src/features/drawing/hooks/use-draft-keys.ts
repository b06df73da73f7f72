import { useEffect, useEffectEvent } from 'react';

const WRITES = 'input:not([type=checkbox]):not([type=radio]), textarea, select, [contenteditable]';
const PRESSED = 'button, a, summary, input, [role=option]';

type DraftKeys = {
  readonly undo: () => void;
  readonly redo: () => void;
  /** What these do while something is drawn; each tells whether there was something to do. */
  readonly close: () => boolean;
  readonly takeBack: () => boolean;
  readonly remove: () => boolean;
  readonly giveUp: () => boolean;
};

/** What a key asks for, as a method; null where it has no meaning here. */
function meaningOf(event: KeyboardEvent): keyof DraftKeys | null {
  const { key, shiftKey, altKey, target } = event;
  if (event.ctrlKey || event.metaKey) {
    const letter = key.toLowerCase();
    if (altKey || (letter !== 'z' && letter !== 'y')) return null;
    return letter === 'y' || shiftKey ? 'redo' : 'undo';
  }
  if (key === 'Escape') return 'giveUp';
  if (key === 'Backspace') return 'takeBack';
  if (key === 'Delete') return 'remove';
  // Enter presses what has the focus
  const isPressed = target instanceof Element && target.closest(PRESSED) !== null;
  return key === 'Enter' && !isPressed ? 'close' : null;
}

/** The keys of a draft. They come before the keys of the plan, and rest while something is written. */
export function useDraftKeys(keys: DraftKeys, active: boolean): void {
  const press = useEffectEvent((event: KeyboardEvent) => {
    const meaning = meaningOf(event);
    if (meaning === null || event.defaultPrevented) return;
    const isWriting = event.target instanceof Element && event.target.closest(WRITES) !== null;
    if (isWriting || document.querySelector('dialog[open]') !== null) return;
    if (keys[meaning]() !== false) event.preventDefault();
  });
  useEffect(() => {
    if (!active) return undefined;
    const listen = (event: KeyboardEvent) => {
      press(event);
    };
    document.addEventListener('keydown', listen, true);
    return () => {
      document.removeEventListener('keydown', listen, true);
    };
  }, [active]);
}
