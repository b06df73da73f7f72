import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cubicHermite } from '../../../shared/numerics/cubic-hermite.ts';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { coefficients, valueAt } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

function slopeAt(c: readonly number[], x: number): number {
  return valueAt(
    c.slice(1).map((term, k) => term * (k + 1)),
    x,
  );
}

describe('cubicHermite', () => {
  it('of x³ from 0 to 2 is 8t³', () => {
    const into = new Float64Array(4);
    cubicHermite(into, 0, 2, { value: 0, slope: 0 }, { value: 8, slope: 12 });
    expect([...into]).toEqual([0, 0, 0, 8]);
  });

  it('writes four numbers where it is told to and no others', () => {
    const into = new Float64Array(6).fill(9);
    cubicHermite(into, 1, 1, { value: 1, slope: 1 }, { value: 2, slope: 1 });
    expect([...into]).toEqual([9, 1, 1, 0, 0, 9]);
  });

  it('reproduces any cubic', () => {
    const cases = fc.tuple(coefficients(3), numbers(-5, 5), numbers(0.1, 3), numbers(0, 1));
    holds(cases, ([c, from, width, t]) => {
      const to = from + width;
      const into = new Float64Array(4);
      cubicHermite(
        into,
        0,
        width,
        { value: valueAt(c, from), slope: slopeAt(c, from) },
        { value: valueAt(c, to), slope: slopeAt(c, to) },
      );
      // terms up to 10 · 8³ and slopes times the width, each rounded
      const got = evaluatePolynomial(into, 0, 3, t);
      expect(Math.abs(got - valueAt(c, from + t * width))).toBeLessThan(1e-10);
    });
  });

  it('keeps within width⁴ · max|f⁗| / 384 of a sine', () => {
    holds(fc.tuple(numbers(-3, 3), numbers(0.05, 1), numbers(0, 1)), ([from, width, t]) => {
      const [to, into] = [from + width, new Float64Array(4)];
      cubicHermite(
        into,
        0,
        width,
        { value: Math.sin(from), slope: Math.cos(from) },
        { value: Math.sin(to), slope: Math.cos(to) },
      );
      const error = Math.abs(evaluatePolynomial(into, 0, 3, t) - Math.sin(from + t * width));
      expect(error).toBeLessThanOrEqual(width ** 4 / 384 + 1e-15);
    });
  });
});
