import type { OwnAppointment } from '../../../shared/schemas/appointments.ts';
import type { OwnLetter } from '../../../shared/schemas/own.ts';

/** The one thing that an owner is asked to do, or what they wait for. */
export type NextStep =
  | { readonly kind: 'read a letter'; readonly letter: OwnLetter }
  | { readonly kind: 'choose a day'; readonly appointment: OwnAppointment }
  | { readonly kind: 'days are with us'; readonly appointment: OwnAppointment }
  | { readonly kind: 'we come'; readonly appointment: OwnAppointment }
  | { readonly kind: 'nothing' };

/** What comes first at a building: a letter that is not acknowledged, then the day of a visit. */
export function nextStep(
  letters: readonly OwnLetter[],
  appointments: readonly OwnAppointment[],
  now: Date,
): NextStep {
  const letter = letters.find(({ acknowledgedAt }) => acknowledgedAt === null);
  if (letter !== undefined) return { kind: 'read a letter', letter };
  const toCome = appointments.filter(({ startsAt }) => new Date(startsAt) > now);
  const offered = toCome.find(({ state }) => state === 'offered');
  if (offered !== undefined) return { kind: 'choose a day', appointment: offered };
  const asked = appointments.find(({ state }) => state === 'another day asked for');
  if (asked !== undefined) return { kind: 'days are with us', appointment: asked };
  const agreed = toCome.find(({ state }) => state === 'agreed');
  return agreed === undefined ? { kind: 'nothing' } : { kind: 'we come', appointment: agreed };
}
