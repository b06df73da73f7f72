import type { DecisionKind } from '../schemas/decisions.ts';

const WORDS: Readonly<Record<DecisionKind, string>> = {
  'let go at stage 1': 'So little ground moves here that nothing has to be done.',
  'let go at stage 2': 'What moves here is so little that nothing has to be done to protect it.',
  'go to stage 3': 'We want to look more closely before we decide. We will write to you again.',
  'adopt a category': 'We have looked at it closely, and know what to expect.',
  'protective measures': 'We have looked at it closely. It is to be protected.',
  'no measures': 'We have looked at it closely. It need not be protected.',
};

/**
 * A decision that has been checked, as an owner is told of it.
 *
 * Units: none. Valid: null where nothing has been decided yet. Source: [own].
 */
export function ownerDecisionWords(kind: DecisionKind | null): string {
  return kind === null ? 'We have not decided yet. We will write to you again.' : WORDS[kind];
}
