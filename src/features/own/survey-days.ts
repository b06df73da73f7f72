import type { AnswerAppointment } from '../../../shared/schemas/appointments.ts';

type AskedDay = Extract<AnswerAppointment, { answer: 'another day' }>['days'][number];

/** A day as it is being typed; empty where none is given yet. */
export type DayDraft = { readonly day: string; readonly part: AskedDay['part'] };

export const NO_DAYS: readonly DayDraft[] = [
  { day: '', part: 'morning' },
  { day: '', part: 'morning' },
  { day: '', part: 'morning' },
];

/** A day of the calendar here, as a field for days takes it. */
function dayHere(moment: Date): string {
  const [month, day] = [moment.getMonth() + 1, moment.getDate()];
  return `${moment.getFullYear()}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
}

/** The first day that can be asked for. */
export function tomorrow(now: Date): string {
  return dayHere(new Date(now.getFullYear(), now.getMonth(), now.getDate() + 1));
}

/** The days that were given, and what is wrong with them, if anything. */
export function givenDays(
  drafts: readonly DayDraft[],
  now: Date,
): { readonly days: AskedDay[]; readonly fault: string | null } {
  const days = drafts.filter(({ day }) => day !== '');
  const told = new Set(days.map(({ day, part }) => `${day} ${part}`));
  const fault =
    days.length === 0
      ? 'Please choose at least one day.'
      : days.some(({ day }) => day < tomorrow(now))
        ? 'Please choose days after today.'
        : told.size < days.length
          ? 'One of the days is there twice.'
          : null;
  return { days, fault };
}
