import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { polynomialBound } from '../../../shared/numerics/polynomial-bound.ts';
import { coefficients } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

describe('polynomialBound', () => {
  it.each([
    ['a constant', [-3], 3],
    ['a line', [1, -4], 3],
    ['1 − t + t²', [1, -1, 1], 1],
  ])('of %s', (_, terms, expected) => {
    expect(polynomialBound(Float64Array.from(terms), 0, terms.length - 1)).toBe(expected);
  });

  it('starts where it is told to', () => {
    expect(polynomialBound(Float64Array.of(99, 1, 2), 1, 1)).toBe(3);
  });

  it('is not passed anywhere', () => {
    holds(fc.tuple(coefficients(5), numbers(0, 1)), ([terms, t]) => {
      const c = Float64Array.from(terms);
      // 1e-13: rounding of coefficients up to 10
      expect(Math.abs(evaluatePolynomial(c, 0, 5, t))).toBeLessThan(
        polynomialBound(c, 0, 5) + 1e-13,
      );
    });
  });
});
