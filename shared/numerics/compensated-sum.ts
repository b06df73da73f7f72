/**
 * A sum that keeps the digits which plain addition of terms of unlike size drops.
 *
 * Units: those of the terms. Valid: finite terms. Source: neumaier-1974.
 */
export function compensatedSum(terms: Iterable<number>): number {
  let sum = 0;
  let lost = 0;
  for (const term of terms) {
    const next = sum + term;
    lost += Math.abs(sum) >= Math.abs(term) ? sum - next + term : term - next + sum;
    sum = next;
  }
  return sum + lost;
}
