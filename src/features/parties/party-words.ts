import { capital } from '../../../shared/presentation/capital.ts';
import type { Party } from '../../../shared/schemas/parties.ts';
import type { PartyDetail } from '../../../shared/schemas/party-answers.ts';
import { formatShortDay } from '../../lib/format-date.ts';

type Interest = Party['interests'][number];

/** Since when and until when an interest is held; nothing where neither is known. */
export function daysWords({ from, to }: Pick<Interest, 'from' | 'to'>): string {
  if (from === null && to === null) return '';
  if (to === null) return `from ${formatShortDay(from ?? '')}`;
  if (from === null) return `until ${formatShortDay(to)}`;
  return `${formatShortDay(from)} to ${formatShortDay(to)}`;
}

/** How letters go to a party. */
export const CHANNEL_WORDS: Readonly<Record<Party['channel'], string>> = {
  'e-mail': 'By e-mail',
  post: 'By post',
};

/** What was done with a party. */
export function doneWords({ action }: PartyDetail['history'][number]): string {
  return action === 'imported' ? 'Brought in from a table' : capital(action);
}

const VALUE_WORDS: Readonly<Record<string, string>> = {
  email: 'e-mail',
  channel: 'letters by',
  representedBy: 'represented by',
};

/** A value of a party as it is called in its history. */
export function valueWords(path: string): string {
  return VALUE_WORDS[path] ?? path;
}
