import type { Measure } from '../../../shared/schemas/measures.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';
import type { State } from '../../components/ui/state-mark.tsx';
import { chainageWords } from '../../../shared/presentation/chainage-words.ts';

/** The shape of each state of a measure. */
export const MEASURE_SHAPES: Readonly<Record<Measure['state'], State>> = {
  proposed: 'not-started',
  agreed: 'waiting',
  'in place': 'in-hand',
  done: 'done',
  'given up': 'not-started',
};

/** The limit that a measure keeps, in a few words. */
export function limitWords({ volumeLoss, from, to }: NonNullable<Measure['limit']>): string {
  return `at most ${percentWords(volumeLoss, 2)} from ${chainageWords(from)} to ${chainageWords(to)}`;
}
