import { useEffect, useEffectEvent } from 'react';
import { singleKeysAreOn } from '../config/single-keys.ts';

/** What each key does; keys as the browser names them, letters small. */
export type Hotkeys = Readonly<Record<string, (event: KeyboardEvent) => void>>;

const WRITES = 'input:not([type=checkbox]):not([type=radio]), textarea, select, [contenteditable]';

function isBusyElsewhere({ target }: KeyboardEvent): boolean {
  if (!(target instanceof Element)) return false;
  if (target.closest(WRITES) !== null) return true;
  // what lies over the page has the keys to itself
  return document.querySelector('dialog[open]') !== null;
}

/**
 * Keys of a screen. They rest while something is being written or a dialog is open. With `first` they come
 * before the keys of what stands around the screen.
 */
export function useHotkeys(keys: Hotkeys, active = true, first = false): void {
  const press = useEffectEvent((event: KeyboardEvent) => {
    if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
    const key = event.key.length === 1 ? event.key.toLowerCase() : event.key;
    const act = keys[key];
    if (act === undefined || isBusyElsewhere(event)) return;
    if (event.key.length === 1 && !singleKeysAreOn()) return;
    event.preventDefault();
    act(event);
  });

  useEffect(() => {
    if (!active) return undefined;
    const listen = (event: KeyboardEvent) => {
      press(event);
    };
    document.addEventListener('keydown', listen, first);
    return () => {
      document.removeEventListener('keydown', listen, first);
    };
  }, [active, first]);
}
