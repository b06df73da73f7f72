import type { KeyHelp } from '../../config/keys-at-hand.ts';

/** The keys that go from sheet to sheet. */
export const SHEET_KEYS: readonly KeyHelp[] = [
  { keys: ['[', ']'], does: 'Previous and next sheet, by reference' },
];
