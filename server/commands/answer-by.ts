import { ANSWER_DAYS, type MatterKind } from '../../shared/schemas/matters.ts';
import { daysAfter, dayOf } from '../days.ts';

const [SUNDAY, SATURDAY] = [0, 6];

/** The day so many working days after another; public holidays count as working days. */
export function workingDaysAfter(day: string, count: number): string {
  let moment = new Date(`${day}T00:00:00Z`);
  for (let left = count; left > 0;) {
    moment = daysAfter(moment, 1);
    const weekday = moment.getUTCDay();
    if (weekday !== SUNDAY && weekday !== SATURDAY) left -= 1;
  }
  return dayOf(moment);
}

/** By when what an owner brings up now is answered. */
export function answerBy(kind: MatterKind, now: Date): string {
  return workingDaysAfter(dayOf(now), ANSWER_DAYS[kind]);
}
