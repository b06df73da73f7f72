import { useSyncExternalStore } from 'react';
import { listsAtHand, onKeysChange, type KeyHelp } from '../config/keys-at-hand.ts';

/** The keys of what is on the screen; two tables share theirs. */
export function useKeysAtHand(): readonly KeyHelp[] {
  const lists = useSyncExternalStore(onKeysChange, listsAtHand);
  return [...new Set(lists)].flat();
}
