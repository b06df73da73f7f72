import { at } from './at.ts';

/**
 * The sums of the first 0, 1, 2, … terms, each with the digits that plain addition of terms of
 * unlike size drops.
 *
 * Units: those of the terms. Valid: finite terms; one sum more than terms, the first is 0.
 * Source: neumaier-1974.
 */
export function runningSums(terms: Float64Array): Float64Array {
  const sums = new Float64Array(terms.length + 1);
  let sum = 0;
  let lost = 0;
  for (let k = 0; k < terms.length; k++) {
    const term = at(terms, k);
    const next = sum + term;
    lost += Math.abs(sum) >= Math.abs(term) ? sum - next + term : term - next + sum;
    sum = next;
    sums[k + 1] = sum + lost;
  }
  return sums;
}
