import { useEffect } from 'react';
import { putAtHand, type KeyHelp } from '../config/keys-at-hand.ts';

/** Lists keys in the keys help for as long as what they work on is on the screen. */
export function useKeyHelp(help: readonly KeyHelp[], active = true): void {
  useEffect(() => (active ? putAtHand(help) : undefined), [help, active]);
}
