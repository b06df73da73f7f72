import { powerOfTwo } from './power-of-two.ts';

const LN2 = 0.6931471805599453;
/** ln 2 in two parts: the first has trailing zero bits, so that n · LN2_HIGH is exact. */
const LN2_HIGH = 0.69314718036912381649;
const LN2_LOW = 1.90821492927058770002e-10;
/** Enough terms of the power series for |r| ≤ ln 2 / 2: the next is under 1e-18. */
const TERMS = 14;

/**
 * eˣ from + − × ÷ alone, so that every engine gives the same bits; x = n ln 2 + r, then the power
 * series in r.
 *
 * Units: none. Valid: all x; relative error under 4e-16 from −708 to 709.7, below that to within the
 * smallest number; 0 below −745.2, Infinity above 709.79.
 * Source: abramowitz-stegun-1964, 4.2.1; the reduction is [own].
 */
export function exponential(x: number): number {
  if (x < -745.2) return 0;
  if (x > 709.79) return Infinity;
  const n = Math.floor(x / LN2 + 0.5);
  const r = x - n * LN2_HIGH - n * LN2_LOW;
  let sum = 1;
  for (let term = TERMS; term > 0; term--) sum = 1 + (r / term) * sum;
  const half = Math.trunc(n / 2);
  return sum * powerOfTwo(half) * powerOfTwo(n - half);
}
