import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import type { MatterKind } from '../../shared/schemas/matters.ts';
import type { Holiday } from '../../shared/schemas/owner-terms.ts';
import { daysAfter, dayIn, dayOf } from '../days.ts';

const [SUNDAY, SATURDAY] = [0, 6];

/** The day so many working days after another: neither weekends nor public holidays. */
export function workingDaysAfter(
  day: string,
  count: number,
  holidays: readonly Pick<Holiday, 'date'>[],
): string {
  const free = new Set(holidays.map(({ date }) => date));
  let moment = new Date(`${day}T00:00:00Z`);
  for (let left = count; left > 0;) {
    moment = daysAfter(moment, 1);
    const weekday = moment.getUTCDay();
    if (weekday !== SUNDAY && weekday !== SATURDAY && !free.has(dayOf(moment))) left -= 1;
  }
  return dayOf(moment);
}

/** By when what an owner brings up now is answered, as days are counted where they live. */
export function answerBy(
  kind: MatterKind,
  now: Date,
  { answerDays, holidays, timeZone }: Pick<LetterSettings, 'answerDays' | 'holidays' | 'timeZone'>,
): string {
  return workingDaysAfter(dayIn(now, timeZone), answerDays[kind], holidays);
}
