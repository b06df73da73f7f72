import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { coefficients, valueAt } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

const c = Float64Array.of(99, 1, 2, 3, 99);

describe('evaluatePolynomial', () => {
  it.each([
    [0, 1],
    [1, 6],
    [2, 17],
    [-1, 2],
  ])('1 + 2t + 3t² at %d is %d', (t, expected) => {
    expect(evaluatePolynomial(c, 1, 2, t)).toBe(expected);
  });

  it('of degree 0 is its coefficient', () => {
    expect(evaluatePolynomial(c, 2, 0, 1e9)).toBe(2);
  });

  it('is the sum of its terms', () => {
    holds(fc.tuple(coefficients(5), numbers(-2, 2)), ([terms, t]) => {
      const got = evaluatePolynomial(Float64Array.from(terms), 0, 5, t);
      // ten roundings of terms that add up to 10 · 63
      expect(Math.abs(got - valueAt(terms, t))).toBeLessThan(1e-12);
    });
  });
});
