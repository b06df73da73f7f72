import type { KeyHelp } from '../../config/keys-at-hand.ts';

/** The keys of the register, beside those of any table. */
export const REGISTER_KEYS: readonly KeyHelp[] = [
  { keys: ['P'], does: 'Show the row on the plan' },
  { keys: ['/'], does: 'Search the register' },
  { keys: ['Esc'], does: 'Close the building, then let go of the row' },
];

/** The keys while an outline is drawn on the map. */
export const LASSO_KEYS: readonly KeyHelp[] = [
  { keys: ['Enter'], does: 'Close the outline' },
  { keys: ['Esc'], does: 'Leave the lasso' },
];

/** The key for who may change the register. */
export const MARK_KEYS: readonly KeyHelp[] = [{ keys: ['X'], does: 'Mark the row' }];
