import { STANDINGS, type DecisionKind, type Standing } from '../../../shared/schemas/decisions.ts';
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

/** What a decision is, as a heading or a cell says it. */
export const KIND_WORDS: Readonly<Record<DecisionKind, string>> = {
  'let go at stage 1': 'Let go at stage 1',
  'let go at stage 2': 'Let go at stage 2',
  'go to stage 3': 'Go to stage 3',
  'adopt a category': 'Adopt a category',
  'protective measures': 'Protective measures',
  'no measures': 'No measures',
};
