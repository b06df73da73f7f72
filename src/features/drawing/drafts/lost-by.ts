import type { Draft } from './draft.ts';
import type { History } from './history.ts';

/** So little is drawn again without a thought. */
const FEW = 3;

/** Whether leaving the page would lose something that was drawn; picking buildings is done again at once. */
export function isWorthKeeping(history: History<Draft> | null): boolean {
  return history !== null && history.present.tool !== 'join' && history.past.length > 0;
}

/** How many corners giving up would lose; nought where they are too few to ask. */
export function lostBy(history: History<Draft> | null): number {
  if (history === null) return 0;
  const { past, present } = history;
  if (present.tool === 'join') return 0;
  const lost = present.tool === 'edit' ? past.length : present.parts.flat(2).length;
  return lost > FEW ? lost : 0;
}
