import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { polynomialIsMonotone } from '../../../shared/numerics/polynomial-is-monotone.ts';
import { coefficients } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

describe('polynomialIsMonotone', () => {
  it.each([
    ['a constant', [3], true],
    ['a rising line', [1, 2], true],
    ['a falling line', [1, -2], true],
    ['t²', [0, 0, 1], true],
    ['t² − t, which turns half-way', [0, -1, 1], false],
    ['a smooth step, 10t³ − 15t⁴ + 6t⁵', [0, 0, 0, 10, -15, 6], true],
  ])('of %s', (_, terms, expected) => {
    expect(polynomialIsMonotone(Float64Array.from(terms), 0, terms.length - 1)).toBe(expected);
  });

  it('starts where it is told to', () => {
    expect(polynomialIsMonotone(Float64Array.of(0, 5, 0, 0, 1), 2, 2)).toBe(true);
  });

  it('is certain: what it calls monotone never turns', () => {
    const cases = fc.tuple(coefficients(5), numbers(0, 50), fc.array(numbers(0, 1)));
    holds(cases, ([terms, slope, places]) => {
      const c = Float64Array.from(terms);
      c[1] = slope;
      if (!polynomialIsMonotone(c, 0, 5)) return;
      const values = [0, ...places.sort((a, b) => a - b), 1].map((t) =>
        evaluatePolynomial(c, 0, 5, t),
      );
      const direction = Math.sign((values.at(-1) ?? NaN) - (values[0] ?? NaN));
      for (const [k, value] of values.slice(1).entries()) {
        // 1e-13: rounding of coefficients up to 50
        expect(direction * (value - (values[k] ?? NaN))).toBeGreaterThan(-1e-13);
      }
    });
  });
});
