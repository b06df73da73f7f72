const TERMS = 11;

/**
 * sin x from + − × ÷ alone, so that every engine gives the same bits.
 *
 * Units: x in radians. Valid: |x| ≤ π, error under 1e-13. Source: abramowitz-stegun-1964, 4.3.65.
 */
export function sine(x: number): number {
  let sum = 1;
  for (let n = TERMS; n > 0; n--) sum = 1 - ((x * x) / (2 * n * (2 * n + 1))) * sum;
  return x * sum;
}
