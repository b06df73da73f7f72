import type { KeyHelp } from '../../config/keys-at-hand.ts';
import { TOOLS } from './tools.ts';

/** The keys of the tools. */
export const TOOL_KEYS: readonly KeyHelp[] = TOOLS.map(({ key, name }) => ({
  keys: [key],
  does: name,
}));

/** The keys while something is drawn. */
export const DRAFT_KEYS: readonly KeyHelp[] = [
  { keys: ['Enter'], does: 'Close the outline; split where the line is' },
  { keys: ['Backspace'], does: 'Take the last corner back' },
  { keys: ['Delete'], does: 'Remove the corner that is chosen' },
  { keys: ['H'], does: 'Add a courtyard to the outline' },
  { keys: ['N'], does: 'Add another part to the building' },
  { keys: ['Shift'], does: 'Keep right angles, while held' },
  { keys: ['Esc'], does: 'Give up what is drawn' },
];
