import type { WaitingAnswer, WaitingItem } from '../../../shared/schemas/waiting.ts';
import { formatWeekday } from '../../lib/format-date.ts';

const BUTTONS: Readonly<Record<WaitingItem['kind'], string>> = {
  'roles-not-filled': 'Give roles',
  'invitations-not-accepted': 'See them',
  'no-buildings': 'Open the plan',
  'no-background': 'Bring it in',
};

/** What the button of something that waits says. */
export function waitingButton(kind: WaitingItem['kind']): string {
  return BUTTONS[kind];
}

/** The first sentence of the page: the day, and what waits. */
export function waitingSentence({ general, schemes }: WaitingAnswer, today: Date): string {
  const all = [...general, ...schemes.flatMap(({ waiting }) => waiting)];
  const day = formatWeekday(today);
  const [first, ...others] = [...all].sort((a, b) => a.since.localeCompare(b.since));
  if (first === undefined) return `${day}. Nothing waits for you.`;
  const since = `the oldest since ${formatWeekday(first.since)}`;
  if (others.length === 0) return `${day}. One thing waits, since ${formatWeekday(first.since)}.`;
  return `${day}. ${all.length} things wait, ${since}.`;
}
