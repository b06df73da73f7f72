import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { at } from '../../../shared/numerics/at.ts';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { writePolynomialHull } from '../../../shared/numerics/polynomial-hull.ts';
import { coefficients } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

function hull(terms: readonly number[]): number[] {
  const into = new Float64Array(2);
  writePolynomialHull(Float64Array.from(terms), 0, terms.length - 1, into, 0);
  return [...into];
}

describe('writePolynomialHull', () => {
  it.each([
    ['a constant', [3], [3, 3]],
    ['a rising line', [1, 2], [1, 3]],
    ['a falling line', [1, -2], [-1, 1]],
    ['1 − t + t²: 1, 1/2, 1', [1, -1, 1], [0.5, 1]],
  ])('of %s', (_, terms, expected) => {
    expect(hull(terms)).toEqual(expected);
  });

  it('writes and reads where it is told to', () => {
    const into = new Float64Array(4).fill(9);
    writePolynomialHull(Float64Array.of(7, 7, 1, 2), 2, 1, into, 1);
    expect([...into]).toEqual([9, 1, 3, 9]);
  });

  it('holds the polynomial everywhere, and its ends are in it', () => {
    holds(fc.tuple(coefficients(5), numbers(0, 1)), ([terms, t]) => {
      const [low = NaN, high = NaN] = hull(terms);
      const value = evaluatePolynomial(Float64Array.from(terms), 0, 5, t);
      // 1e-13: rounding of coefficients up to 10
      expect(value).toBeGreaterThan(low - 1e-13);
      expect(value).toBeLessThan(high + 1e-13);
      expect(low).toBeLessThanOrEqual(terms[0] ?? NaN);
    });
  });

  it('turns over with the polynomial', () => {
    holds(coefficients(4), (terms) => {
      const [low = NaN, high = NaN] = hull(terms);
      const over = hull(terms.map((term) => -term));
      expect(at(Float64Array.from(over), 0)).toBeCloseTo(-high, 13);
      expect(at(Float64Array.from(over), 1)).toBeCloseTo(-low, 13);
    });
  });
});
