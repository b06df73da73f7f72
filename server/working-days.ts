import type { Holiday } from '../shared/schemas/owner-terms.ts';
import { daysAfter, dayOf } from './days.ts';
import { nearDayInWords } from './mail/letters/day-in-words.ts';

type Holidays = readonly Pick<Holiday, 'date'>[];

const [SUNDAY, SATURDAY] = [0, 6];

/** The day so many working days after another: neither weekends nor public holidays. */
export function workingDaysAfter(day: string, count: number, holidays: Holidays): string {
  const free = new Set(holidays.map(({ date }) => date));
  let moment = new Date(`${day}T00:00:00Z`);
  for (let left = count; left > 0;) {
    moment = daysAfter(moment, 1);
    const weekday = moment.getUTCDay();
    if (weekday !== SUNDAY && weekday !== SATURDAY && !free.has(dayOf(moment))) left -= 1;
  }
  return dayOf(moment);
}

/** The day itself where it is a working day, else the next one. */
export function workingDayFrom(day: string, holidays: Holidays): string {
  const before = dayOf(daysAfter(new Date(`${day}T00:00:00Z`), -1));
  return workingDaysAfter(before, 1, holidays);
}

/** What is to be said of a day that is no working day: which it is, and the next that is one; null of others. */
export function freeDayWords(day: string, holidays: readonly Holiday[]): string | null {
  const next = workingDayFrom(day, holidays);
  if (next === day) return null;
  const holiday = holidays.find(({ date }) => date === day);
  const what = holiday === undefined ? 'no working day' : `a holiday, ${holiday.name}`;
  return `${nearDayInWords(day)} is ${what}. The next working day is ${nearDayInWords(next)}.`;
}
