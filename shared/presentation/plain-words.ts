import { CATEGORIES } from '../damage/categories.ts';
import type { RunResult } from '../schemas/runs.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { slopeWords } from './slope-words.ts';
import { categoryLabel } from './bracket-words.ts';

function movement({ settlement, slope }: RunResult): string {
  return `${millimetresFromMetres(settlement).toFixed(1)} mm at most, sloping ${slopeWords(slope)} at most`;
}

/**
 * What of a building has to be assumed, and so would be settled by a visit.
 *
 * Units: none. Valid: null where nothing is assumed. Source: [own].
 */
export function assumedWords(assumed: readonly string[]): string | null {
  if (assumed.length === 0) return null;
  return assumed.length === 1
    ? 'One value is assumed. A visit would settle it.'
    : `${assumed.length} values are assumed. A visit would settle them.`;
}

/**
 * What a run found of a building, in sentences for whoever has to decide.
 *
 * Units: as RunResult. Valid: any recorded result. Source: [own].
 */
export function plainWords(result: RunResult): readonly string[] {
  const { categoryLow, categoryHigh, heldBy } = result;
  if (result.fault !== null) {
    return [`Nothing could be worked out: ${result.fault}`, 'Put the levels right and run again.'];
  }
  if (categoryLow === null || categoryHigh === null) {
    return [
      `Over the whole range of volume loss and K the ground here settles ${movement(result)}.`,
      'Screening lets it go at stage 1.',
    ];
  }
  const spread =
    categoryLow === categoryHigh
      ? `stays in category ${categoryLabel(categoryLow)}`
      : `is in category ${categoryLabel(categoryLow)} to ${categoryLabel(categoryHigh)}`;
  const held =
    heldBy.length === 0 ? [] : [`It is held whatever the figures: ${heldBy.join(', ')}.`];
  const end = result.stage === 2 ? ['The strain stage lets it go at stage 2.'] : [];
  return [
    `Over the whole range of volume loss and K this building ${spread}. The ground settles ${movement(result)}.`,
    `At the worst: ${CATEGORIES[categoryHigh]?.repair.toLowerCase() ?? ''}`,
    ...held,
    ...end,
  ];
}
