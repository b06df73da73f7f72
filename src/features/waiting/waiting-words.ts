import type { WaitingAnswer, WaitingItem } from '../../../shared/schemas/waiting.ts';
import { formatDaySince, formatWeekday } from '../../lib/format-date.ts';
import { countInWords } from '../../lib/number-words.ts';

const BUTTONS: Readonly<Record<WaitingItem['kind'], string>> = {
  'roles-not-filled': 'Give roles',
  'invitations-not-accepted': 'See them',
  'no-buildings': 'Open the plan',
  'no-background': 'Bring it in',
  'decisions-to-check': 'Check them',
  'decisions-returned': 'See them',
  'decisions-again': 'See them',
  'letters-to-check': 'Check them',
  'letters-to-send': 'Send them',
  'letters-returned': 'See them',
  'matters-waiting': 'Answer them',
  'appointments-asked': 'See them',
  'undertakings-overdue': 'See them',
};

/** What the button of something that waits says. */
export function waitingButton(kind: WaitingItem['kind']): string {
  return BUTTONS[kind];
}

const THINGS: Readonly<Record<WaitingItem['kind'], readonly [one: string, several: string]>> = {
  'roles-not-filled': ['role to fill', 'roles to fill'],
  'invitations-not-accepted': ['invitation still out', 'invitations still out'],
  'no-buildings': ['register to begin', 'registers to begin'],
  'no-background': ['background map to bring in', 'background maps to bring in'],
  'decisions-to-check': ['decision to check', 'decisions to check'],
  'decisions-returned': ['decision returned', 'decisions returned'],
  'decisions-again': ['decision to look at again', 'decisions to look at again'],
  'letters-to-check': ['batch of letters to check', 'batches of letters to check'],
  'letters-to-send': ['batch of letters to send', 'batches of letters to send'],
  'letters-returned': ['batch of letters returned', 'batches of letters returned'],
  'matters-waiting': ['message to answer', 'messages to answer'],
  'appointments-asked': ['other day asked for', 'other days asked for'],
  'undertakings-overdue': ['undertaking overdue', 'undertakings overdue'],
};

/** What there are so many of. */
export function waitingThing({ kind, count }: Pick<WaitingItem, 'kind' | 'count'>): string {
  const [one, several] = THINGS[kind];
  return count === 1 ? one : several;
}

/** The first sentence of the page: the day, and what has waited longest. */
export function waitingSentence({ general, schemes }: WaitingAnswer, now: Date): string {
  const all = [...general, ...schemes.flatMap(({ waiting }) => waiting)];
  const [oldest, ...others] = [...all].sort((a, b) => a.since.localeCompare(b.since));
  const day = `${formatWeekday(now)}.`;
  if (oldest === undefined) return `${day} Nothing waits for you.`;
  const since = formatDaySince(oldest.since, now);
  if (others.length === 0) return `${day} One thing waits, since ${since}.`;
  const count = countInWords(all.length);
  return `${day} ${count.charAt(0).toUpperCase()}${count.slice(1)} things wait, the oldest since ${since}.`;
}
