import type { KeyHelp } from '../../config/keys-at-hand.ts';

/** The keys of the section while it is shown. */
export const SECTION_KEYS: readonly KeyHelp[] = [
  { keys: [',', '.'], does: 'Step the section 5 m back or on' },
  { keys: ['T'], does: 'Show the section as a table, or drawn' },
];
