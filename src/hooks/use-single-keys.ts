import { useSyncExternalStore } from 'react';
import { onSingleKeysChange, singleKeysAreOn } from '../config/single-keys.ts';

/** Whether keys pressed alone do something. */
export function useSingleKeys(): boolean {
  return useSyncExternalStore(onSingleKeysChange, singleKeysAreOn);
}
