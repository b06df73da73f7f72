import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { polynomialSide } from '../../../shared/numerics/polynomial-side.ts';
import { coefficients } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

describe('polynomialSide', () => {
  it.each([
    ['a constant above', [3], 2, 1],
    ['a constant below', [1], 2, -1],
    ['a constant on the level', [2], 2, 0],
    ['a line that passes', [0, 1], 0.5, 0],
    ['a line above', [1, 1], 0.5, 1],
    ['a line that touches at its end', [0, 1], 1, 0],
    ['a parabola that touches', [0.25, -1, 1], 0, 0],
    ['a parabola well above', [1, -1, 1], 0.4, 1],
    ['a parabola below', [-1, 1, -1], 0, -1],
  ])('of %s', (_, terms, level, expected) => {
    expect(polynomialSide(Float64Array.from(terms), 0, terms.length - 1, level)).toBe(expected);
  });

  it('starts where it is told to', () => {
    expect(polynomialSide(Float64Array.of(-9, -9, 1, 1), 2, 1, 0.5)).toBe(1);
  });

  it('may not know: the hull is wider than the polynomial', () => {
    // 0.3 − t + t² is 0.05 at least, its middle Bernstein coefficient is −0.2
    expect(polynomialSide(Float64Array.of(0.3, -1, 1), 0, 2, 0)).toBe(0);
  });

  it('is certain: what it says holds everywhere', () => {
    const cases = fc.tuple(coefficients(5), numbers(-10, 10), fc.array(numbers(0, 1)));
    holds(
      cases,
      ([terms, level, places]) => {
        const c = Float64Array.from(terms);
        const side = polynomialSide(c, 0, 5, level);
        for (const t of [0, 0.25, 0.5, 0.75, 1, ...places]) {
          // 1e-13: rounding of coefficients up to 10
          if (side !== 0) {
            expect(side * (evaluatePolynomial(c, 0, 5, t) - level)).toBeGreaterThan(-1e-13);
          }
        }
      },
      1000,
    );
  });

  it('turns over with the polynomial', () => {
    holds(fc.tuple(coefficients(4), numbers(-10, 10)), ([terms, level]) => {
      const over = terms.map((term) => -term);
      const side = polynomialSide(Float64Array.from(terms), 0, 4, level);
      expect(polynomialSide(Float64Array.from(over), 0, 4, -level) + side).toBe(0);
    });
  });

  it('knows whenever the level is far enough off', () => {
    holds(coefficients(5, 1), (terms) => {
      expect(polynomialSide(Float64Array.from(terms), 0, 5, 6.1)).toBe(-1);
      expect(polynomialSide(Float64Array.from(terms), 0, 5, -6.1)).toBe(1);
    });
  });
});
