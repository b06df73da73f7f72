import type { Undertaking } from '../../../shared/schemas/undertakings.ts';
import type { State } from '../../components/ui/state-mark.tsx';
import { formatShortDay } from '../../lib/format-date.ts';
import { chainageWords } from '../../../shared/presentation/chainage-words.ts';

/** To whom it was made; the name of a party is not told to everybody. */
export function madeToWords({ madeTo }: Pick<Undertaking, 'madeTo'>): string {
  if (madeTo === null) return 'An owner';
  return madeTo === '' ? 'Erased' : madeTo;
}

/** A stretch of the line. */
export function stretchWords({ from, to }: NonNullable<Undertaking['stretch']>): string {
  return `${chainageWords(from)} to ${chainageWords(to)}`;
}

/** How far an undertaking is: its shape and its words. */
export function undertakingState({ doneOn, isOverdue }: Undertaking): {
  readonly shape: State;
  readonly words: string;
} {
  if (doneOn !== null) return { shape: 'done', words: `Done ${formatShortDay(doneOn)}` };
  return isOverdue ? { shape: 'visit', words: 'Overdue' } : { shape: 'waiting', words: 'Open' };
}
