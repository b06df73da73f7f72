import type { OwnAppointment } from '../../../shared/schemas/appointments.ts';
import type { Own, OwnLetter } from '../../../shared/schemas/own.ts';
import { formatDay, formatWeekdayMoment } from '../../lib/format-date.ts';

/** Something that was, is next, or is to come. */
export type Step = {
  readonly when: string;
  readonly title: string;
  readonly words: string;
  readonly state: 'done' | 'now' | 'next';
};

/** When the page is read, and by the clocks of which time zone times are told. */
type Here = { readonly now: Date; readonly zone: string };

type Dated = Step & { readonly at: string };

const VISITS: Readonly<Record<OwnAppointment['purpose'], readonly [string, string, string]>> = {
  'condition survey': [
    'A surveyor visits you',
    'A surveyor visited you',
    'They photograph every room and keep a copy for you.',
  ],
  access: [
    'An engineer visits you',
    'An engineer visited you',
    'They look at the walls, the floors and the cellar.',
  ],
};

function ofLetter({ sentAt, acknowledgedAt, answerBy }: OwnLetter, zone: string): Dated {
  const asked =
    answerBy === null ? '' : `Please tell us by ${formatDay(answerBy)} that you have it.`;
  return {
    at: sentAt,
    when: formatDay(sentAt, zone),
    title: 'We wrote to you',
    words: acknowledgedAt === null ? asked : `You confirmed on ${formatDay(acknowledgedAt, zone)}.`,
    state: 'done',
  };
}

function lengthWords(minutes: number): string {
  if (minutes < 50) return `About ${minutes} minutes.`;
  const hours = Math.round(minutes / 60);
  return hours === 1 ? 'About an hour.' : `About ${hours} hours.`;
}

function ofAppointment(
  { purpose, startsAt, minutes, state }: OwnAppointment,
  { now, zone }: Here,
): Dated {
  const [title, past, words] = VISITS[purpose];
  const isDone = state === 'done';
  if (isDone) {
    return { at: startsAt, when: formatDay(startsAt, zone), title: past, words: '', state: 'done' };
  }
  const isAsked = state === 'another day asked for';
  const isToCome = new Date(startsAt) > now;
  return {
    at: startsAt,
    when: isAsked ? 'Another day' : formatWeekdayMoment(startsAt, zone),
    title,
    words: isAsked
      ? 'You asked for another day. We will write to you.'
      : `${lengthWords(minutes)} ${words}`,
    state: isToCome || isAsked ? 'next' : 'done',
  };
}

/** What happens at a building, and when: what is dated in order, then what is planned for everybody. */
export function timelineOf(
  letters: readonly OwnLetter[],
  appointments: readonly OwnAppointment[],
  milestones: Own['milestones'],
  here: Here,
): Step[] {
  const visits = appointments
    .filter(({ state }) => state !== 'cancelled')
    .map((appointment) => ofAppointment(appointment, here));
  const dated = [...letters.map((letter) => ofLetter(letter, here.zone)), ...visits].sort((a, b) =>
    a.at.localeCompare(b.at),
  );
  const next = dated.find(({ state }) => state === 'next');
  return [
    ...dated.map(({ when, title, words, state }): Step => ({ when, title, words, state })),
    ...milestones.map((one): Step => ({ ...one, state: 'next' })),
  ].map((step, index) =>
    next !== undefined && index === dated.indexOf(next) ? { ...step, state: 'now' } : step,
  );
}
