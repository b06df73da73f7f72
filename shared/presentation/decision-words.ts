import type { Category } from '../damage/categories.ts';
import type { DecisionKind, Standing } from '../schemas/decisions.ts';
import { categoryLabel } from './bracket-words.ts';

/**
 * What a decision is, as a heading or a cell says it.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const KIND_WORDS: Readonly<Record<DecisionKind, string>> = {
  'let go at stage 1': 'Let go at stage 1',
  'let go at stage 2': 'Let go at stage 2',
  'go to stage 3': 'Go to stage 3',
  'adopt a category': 'Adopt a category',
  'protective measures': 'Protective measures',
  'no measures': 'No measures',
};

type DecisionTold = { readonly kind: DecisionKind; readonly category: Category | null };

/**
 * What was decided, in a few words.
 *
 * Units: none. Valid: any decision. Source: [own].
 */
export function decisionTitle({ kind, category }: DecisionTold): string {
  if (kind !== 'adopt a category') return KIND_WORDS[kind];
  return `Category ${category === null ? '–' : categoryLabel(category)} adopted`;
}

/**
 * What is decided of a building for an option, and where that stands.
 *
 * Units: none. Valid: not 'to decide', as then there is none. Source: [own].
 */
export type DecisionNow = DecisionTold & { readonly state: Standing };

/**
 * What is decided of a building, and where that stands unless it is in force; null is not decided yet.
 *
 * Units: none. Valid: the newest decision for an option. Source: [own].
 */
export function standingWords(now: DecisionNow | null): string {
  if (now === null) return 'To decide';
  const title = decisionTitle(now);
  return now.state === 'decided' ? title : `${title}, ${now.state}`;
}
