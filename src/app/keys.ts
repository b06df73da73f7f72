import type { KeyHelp } from '../config/keys-at-hand.ts';

/** The keys that work on every screen. */
export const KEYS: readonly KeyHelp[] = [
  { keys: ['/'], does: 'Go to a scheme, a screen or a building' },
  { keys: ['?'], does: 'Show the keys here' },
  { keys: ['Esc'], does: 'Close what lies over the page' },
];
