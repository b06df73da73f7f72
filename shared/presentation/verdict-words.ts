import type { RunResult } from '../schemas/runs.ts';
import { categoryLabel } from './bracket-words.ts';

/**
 * How a category at the central values stands over the bracket; null where there is none.
 *
 * Units: none. Valid: any recorded result. Source: [own].
 */
export function overBracketWords({
  categoryLow,
  categoryHigh,
}: Pick<RunResult, 'categoryLow' | 'categoryHigh'>): string | null {
  if (categoryLow === null || categoryHigh === null) return null;
  return categoryLow === categoryHigh
    ? 'central; the same over the bracket'
    : `central; ${categoryLabel(categoryLow)} to ${categoryLabel(categoryHigh)} over the bracket`;
}
