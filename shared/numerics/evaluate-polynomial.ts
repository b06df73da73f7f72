import { at } from './at.ts';

/**
 * c₀ + c₁t + … by Horner's rule, from coefficients that stand in a larger array.
 *
 * Units: those of c. Valid: `offset` + `degree` inside the array. Source: [own].
 */
export function evaluatePolynomial(
  c: Float64Array,
  offset: number,
  degree: number,
  t: number,
): number {
  let sum = at(c, offset + degree);
  for (let k = degree - 1; k >= 0; k--) sum = sum * t + at(c, offset + k);
  return sum;
}
