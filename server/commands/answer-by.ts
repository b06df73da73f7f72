import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import type { MatterKind } from '../../shared/schemas/matters.ts';
import { dayIn } from '../days.ts';
import { workingDaysAfter } from '../working-days.ts';

/** By when what an owner brings up now is answered, as days are counted where they live. */
export function answerBy(
  kind: MatterKind,
  now: Date,
  { answerDays, holidays, timeZone }: Pick<LetterSettings, 'answerDays' | 'holidays' | 'timeZone'>,
): string {
  return workingDaysAfter(dayIn(now, timeZone), answerDays[kind], holidays);
}
