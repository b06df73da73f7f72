import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluatePolynomial } from '../../../shared/numerics/evaluate-polynomial.ts';
import { quinticHermite } from '../../../shared/numerics/quintic-hermite.ts';
import { coefficients, valueAt } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

function derivative(c: readonly number[]): number[] {
  return c.slice(1).map((term, k) => term * (k + 1));
}

function ends(
  c: readonly number[],
  x: number,
): { value: number; slope: number; curvature: number } {
  const slope = derivative(c);
  return {
    value: valueAt(c, x),
    slope: valueAt(slope, x),
    curvature: valueAt(derivative(slope), x),
  };
}

describe('quinticHermite', () => {
  it('of x⁵ from 0 to 2 is 32t⁵', () => {
    const into = new Float64Array(6);
    const end = { value: 32, slope: 80, curvature: 160 };
    quinticHermite(into, 0, 2, { value: 0, slope: 0, curvature: 0 }, end);
    expect([...into]).toEqual([0, 0, 0, 0, 0, 32]);
  });

  it('of a step without slope or curvature is 10t³ − 15t⁴ + 6t⁵', () => {
    const into = new Float64Array(6);
    const flat = { slope: 0, curvature: 0 };
    quinticHermite(into, 0, 1, { value: 0, ...flat }, { value: 1, ...flat });
    expect([...into]).toEqual([0, 0, 0, 10, -15, 6]);
  });

  it('writes six numbers where it is told to and no others', () => {
    const into = new Float64Array(8).fill(9);
    const line = { slope: 1, curvature: 0 };
    quinticHermite(into, 1, 1, { value: 1, ...line }, { value: 2, ...line });
    expect([...into]).toEqual([9, 1, 1, 0, 0, 0, 0, 9]);
  });

  it('reproduces any quintic', () => {
    const cases = fc.tuple(coefficients(5), numbers(-2, 2), numbers(0.1, 2), numbers(0, 1));
    holds(cases, ([c, from, width, t]) => {
      const into = new Float64Array(6);
      quinticHermite(into, 0, width, ends(c, from), ends(c, from + width));
      // terms up to 10 · 4⁵, curvatures of 20 · 10 · 4³ times the width squared, each rounded
      const got = evaluatePolynomial(into, 0, 5, t);
      expect(Math.abs(got - valueAt(c, from + t * width))).toBeLessThan(1e-9);
    });
  });

  it('keeps within width⁶ · max|f⁽⁶⁾| / 46080 of a sine', () => {
    holds(fc.tuple(numbers(-3, 3), numbers(0.2, 1), numbers(0, 1)), ([from, width, t]) => {
      const into = new Float64Array(6);
      const [start, end] = [from, from + width].map((x) => ({
        value: Math.sin(x),
        slope: Math.cos(x),
        curvature: -Math.sin(x),
      }));
      if (start === undefined || end === undefined) throw new Error('two ends');
      quinticHermite(into, 0, width, start, end);
      const error = Math.abs(evaluatePolynomial(into, 0, 5, t) - Math.sin(from + t * width));
      expect(error).toBeLessThanOrEqual(width ** 6 / 46080 + 2e-15);
    });
  });

  it('is the same read from its other end', () => {
    const cases = fc.tuple(fc.array(numbers(-5, 5), { minLength: 6, maxLength: 6 }), numbers(0, 1));
    holds(cases, ([[v0 = 0, s0 = 0, k0 = 0, v1 = 0, s1 = 0, k1 = 0], t]) => {
      const [there, back] = [new Float64Array(6), new Float64Array(6)];
      quinticHermite(
        there,
        0,
        2,
        { value: v0, slope: s0, curvature: k0 },
        { value: v1, slope: s1, curvature: k1 },
      );
      quinticHermite(
        back,
        0,
        2,
        { value: v1, slope: -s1, curvature: k1 },
        { value: v0, slope: -s0, curvature: k0 },
      );
      // coefficients up to 400, rounded
      expect(evaluatePolynomial(there, 0, 5, t)).toBeCloseTo(
        evaluatePolynomial(back, 0, 5, 1 - t),
        11,
      );
    });
  });
});
