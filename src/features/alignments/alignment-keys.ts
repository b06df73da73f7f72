import type { KeyHelp } from '../../config/keys-at-hand.ts';

/** The key of the line. */
export const LINE_KEYS: readonly KeyHelp[] = [
  { keys: ['A'], does: 'Edit the line, or draw the first one' },
];

/** The keys while a line is drawn. */
export const LINE_DRAFT_KEYS: readonly KeyHelp[] = [
  { keys: ['Enter'], does: 'End the line' },
  { keys: ['Backspace'], does: 'Take the last point back' },
  { keys: ['Delete'], does: 'Remove the point that is chosen' },
  { keys: ['Ctrl Z'], does: 'Undo' },
  { keys: ['Ctrl Shift Z'], does: 'Redo' },
  { keys: ['Esc'], does: 'Give up what is drawn' },
];
