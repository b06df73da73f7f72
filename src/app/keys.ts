import type { KeyHelp } from '../components/layout/keys-help.tsx';

/** The keys that work on every screen and in every table. */
export const KEYS: readonly KeyHelp[] = [
  { keys: ['/'], does: 'Go to a scheme or a screen' },
  { keys: ['?'], does: 'Show the keys here' },
  { keys: ['J', 'K'], does: 'Next and previous row of a table' },
  { keys: ['Enter', 'O'], does: 'Open the row' },
  { keys: ['Esc'], does: 'Close what lies over the page' },
];
