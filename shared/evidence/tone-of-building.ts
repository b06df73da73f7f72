import { CATEGORIES } from '../damage/categories.ts';
import { bandOf } from '../presentation/settlement-bands.ts';
import type { PlanContent } from '../schemas/evidence.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import type { Tone } from './marks.ts';
import type { PlanBuilding } from './plan-material.ts';

const CATEGORY_AT = { low: 'categoryLow', central: 'category', high: 'categoryHigh' } as const;

/**
 * What a building of a plan takes its colour from; null where it takes none: let go at stage 1, not worked
 * out, or under the least settlement that is drawn.
 *
 * Units: as Tone. Valid: any building. Source: [own].
 */
export function toneOfBuilding(
  { result }: Pick<PlanBuilding, 'result'>,
  shows: PlanContent['shows'],
): Tone | null {
  if (shows === 'stage') return result.stage > 1 ? { by: 'stage', number: result.stage } : null;
  if (shows === 'settlement') {
    const band = bandOf(result.settlement);
    return band < 0 ? null : { by: 'settlement', number: band };
  }
  const category = result[CATEGORY_AT[shows]];
  return category === null ? null : { by: 'category', number: category };
}

/**
 * What is written in a building that takes a colour: its category, its stage, or its settlement in mm.
 *
 * Units: mm in whole numbers, tenths where a whole one would be of another band. Valid: the tone of that building. Source: [own].
 */
export function wordsOfTone(tone: Tone, { result }: Pick<PlanBuilding, 'result'>): string {
  if (tone.by === 'category') return CATEGORIES[tone.number]?.label ?? '';
  if (tone.by === 'stage') return String(tone.number);
  const millimetres = millimetresFromMetres(result.settlement);
  const whole = Math.round(millimetres);
  // a figure that rounds up into the next band would not agree with its colour
  const agrees = bandOf(whole / 1000) === tone.number;
  return agrees ? String(whole) : (Math.floor(10 * millimetres) / 10).toFixed(1);
}
