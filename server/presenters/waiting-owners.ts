import type { WaitingItem } from '../../shared/schemas/waiting.ts';
import type { OwnersWaiting } from '../models/find-owners-waiting.ts';
import type { SchemeActor } from '../policies/actor.ts';
import { schemePolicy } from '../policies/scheme-policy.ts';

function item(
  kind: WaitingItem['kind'],
  { count, since }: { readonly count: number; readonly since: Date | null },
  words: { readonly text: string; readonly link: string },
): WaitingItem[] {
  if (count === 0 || since === null) return [];
  return [{ kind, count, since: since.toISOString(), ...words }];
}

function mattersInWords(late: number): string {
  if (late === 0) return 'Given to you or to nobody yet.';
  return `Given to you or to nobody yet; ${late} past the day that was promised.`;
}

/** What between the team and owners waits for whoever may see to it. */
export function presentOwnersWaiting(
  page: string,
  actor: SchemeActor,
  { toCheck, toSend, returned, matters, appointments, undertakings }: OwnersWaiting,
): WaitingItem[] {
  const letters = `${page}/owners/letters`;
  return [
    ...(schemePolicy.checkLetters(actor)
      ? [
          ...item('letters-to-check', toCheck, {
            text: 'Prepared by somebody else.',
            link: letters,
          }),
          ...item('letters-to-send', toSend, { text: 'Checked, and not sent yet.', link: letters }),
        ]
      : []),
    ...(schemePolicy.prepareLetters(actor)
      ? item('letters-returned', returned, { text: 'Returned with a comment.', link: letters })
      : []),
    ...(schemePolicy.answerMatters(actor)
      ? [
          ...item('matters-waiting', matters, {
            text: mattersInWords(matters.late),
            link: `${page}/owners/inbox`,
          }),
          ...item('appointments-asked', appointments, {
            text: 'The day that was offered does not suit.',
            link: `${page}/owners/appointments`,
          }),
        ]
      : []),
    ...(schemePolicy.updateUndertakings(actor)
      ? item('undertakings-overdue', undertakings, {
          text: 'Promised, and not done by the day.',
          link: `${page}/owners/undertakings`,
        })
      : []),
  ];
}
