import { at } from './at.ts';

/**
 * The coefficients of the derivative, as an array of its own.
 *
 * Units: those of c per t. Valid: degree ≥ 1. Source: [own].
 */
export function derivativeOfPolynomial(
  c: Float64Array,
  offset: number,
  degree: number,
): Float64Array {
  const derivative = new Float64Array(degree);
  for (let k = 1; k <= degree; k++) derivative[k - 1] = k * at(c, offset + k);
  return derivative;
}
