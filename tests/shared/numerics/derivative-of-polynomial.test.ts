import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { derivativeOfPolynomial } from '../../../shared/numerics/derivative-of-polynomial.ts';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { coefficients } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

describe('derivativeOfPolynomial', () => {
  it('of 5 + t + 2t² + 3t³ is 1 + 4t + 9t²', () => {
    expect([...derivativeOfPolynomial(Float64Array.of(5, 1, 2, 3), 0, 3)]).toEqual([1, 4, 9]);
  });

  it('starts where it is told to', () => {
    expect([...derivativeOfPolynomial(Float64Array.of(7, 7, 5, 1, 2), 2, 2)]).toEqual([1, 4]);
  });

  it('of a straight line is its slope', () => {
    expect([...derivativeOfPolynomial(Float64Array.of(3, -2), 0, 1)]).toEqual([-2]);
  });

  it('is the slope of the polynomial', () => {
    holds(fc.tuple(coefficients(5), numbers(-1, 1)), ([terms, t]) => {
      const c = Float64Array.from(terms);
      const h = 1e-4;
      const rise = evaluatePolynomial(c, 0, 5, t + h) - evaluatePolynomial(c, 0, 5, t - h);
      const slope = evaluatePolynomial(derivativeOfPolynomial(c, 0, 5), 0, 4, t);
      // h²/6 of a third derivative of at most 900, and 1e-14/h of rounding
      expect(Math.abs(rise / (2 * h) - slope)).toBeLessThan(3e-6);
    });
  });
});
