import type { KeyHelp } from '../../config/keys-at-hand.ts';

/** The keys of what a run found. */
export const RUN_KEYS: readonly KeyHelp[] = [
  { keys: ['1', '2', '3'], does: 'Show categories at the low, central and high value' },
];
