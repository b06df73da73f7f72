import { STANDINGS, type Standing } from '../../../shared/schemas/decisions.ts';
import type { State } from '../../components/ui/state-mark.tsx';

/** The shape and the word of each state of the assessors' list. */
export const STANDING_MARKS: Readonly<
  Record<Standing, { readonly shape: State; readonly words: string }>
> = {
  'to decide': { shape: 'not-started', words: 'To decide' },
  'waiting for check': { shape: 'waiting', words: 'Waiting for check' },
  returned: { shape: 'in-hand', words: 'Returned' },
  'to look at again': { shape: 'visit', words: 'Look at again' },
  decided: { shape: 'done', words: 'Decided' },
};

export function isStanding(text: string): text is Standing {
  return STANDINGS.some((standing) => standing === text);
}
