import { at } from './at.ts';

/**
 * The interval of growing values that holds x, by halving: the largest k with values[k] ≤ x, kept
 * between the first and the last interval.
 *
 * Units: those of the values; the index is a count. Valid: at least two values, in growing order.
 * Source: [own], bisection.
 */
export function intervalIndex(values: Float64Array, x: number): number {
  let low = 0;
  let high = values.length - 1;
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (at(values, middle) <= x) low = middle;
    else high = middle;
  }
  return low;
}
