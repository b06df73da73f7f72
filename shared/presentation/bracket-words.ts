import { bracketCategories, type Bracket } from '../assessment/bracket.ts';
import { LARGEST_VOLUME_LOSS, type Breakpoint } from '../assessment/breakpoint-of-wall.ts';
import { BRACKET_INPUTS, type Sensitivity } from '../assessment/sensitivity.ts';
import { CATEGORIES, type Category } from '../damage/categories.ts';
import type { Range } from '../numerics/range.ts';
import { percentFromRatio } from '../units/percent-from-ratio.ts';

/**
 * The number of a category as people write it.
 *
 * Units: none. Valid: any category. Source: [own].
 */
export function categoryLabel(category: Category): string {
  return CATEGORIES[category]?.label ?? '';
}

/**
 * A strain or volume loss in per cent.
 *
 * Units: ratio m/m. Valid: finite. Source: [own].
 */
export function percentWords(ratio: number, digits: number): string {
  return `${percentFromRatio(ratio).toFixed(digits).replace('-', '\u2212')}\u00a0%`;
}

/**
 * The categories of a bracket from the lowest to the highest, as "Category 0 or 1".
 *
 * Units: as Bracket. Valid: a bracket of at least one strain. Source: [own].
 */
export function categoriesWords(bracket: Bracket): string {
  const all = bracketCategories(bracket).flat();
  const present = CATEGORIES.map(({ category }) => category).filter((one) => all.includes(one));
  const [lowest = 0] = present;
  const highest = present.at(-1) ?? lowest;
  if (present.length < 3) return `Category ${present.map(categoryLabel).join(' or ')}`;
  return `Category ${categoryLabel(lowest)} to ${categoryLabel(highest)}`;
}

/**
 * Whether the category holds over the whole range, and what it is sensitive to where it does not.
 *
 * Units: none. Valid: made by `sensitivityOf`. Source: [own].
 */
export function settledWords({ settled, input }: Sensitivity): string {
  if (settled || input === null) return 'Settled: the category holds over the whole range.';
  return `Sensitive, most of all to ${BRACKET_INPUTS[input]}.`;
}

function placeInRange(value: number, { low, central, high }: Range): string {
  if (value > high) return 'above the high value';
  if (value > central) return 'above the central value, not above the high';
  return value > low ? 'not above the central value' : 'not above the low value';
}

/**
 * Where the wall breaks into the category that leads on, in a sentence.
 *
 * Units: volume losses m/m. Valid: undefined where none is reached. Source: [own].
 */
export function breakpointWords(breakpoint: Breakpoint | undefined, volumeLoss: Range): string {
  if (breakpoint === undefined) return `None below ${percentWords(LARGEST_VOLUME_LOSS, 0)}.`;
  const place = placeInRange(breakpoint.volumeLoss, volumeLoss);
  return `Breaks at ${percentWords(breakpoint.volumeLoss, 2)}: ${place}.`;
}
