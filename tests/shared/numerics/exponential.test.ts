import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { exponential } from '../../../shared/numerics/exponential.ts';
import { preciseExponential, relativeError } from '../../support/high-precision.ts';
import { holds, numbers } from '../../support/property.ts';

describe('exponential', () => {
  it.each([
    [0, 1],
    [-0, 1],
    [1, Math.E],
    [Math.LN2, 2],
    [-Math.LN2, 0.5],
    [10 * Math.LN2, 1024],
  ])('of %d is %d', (x, expected) => {
    // 4e-16 of the function, and half a unit in the last place of the argument times itself
    expect(Math.abs(exponential(x) / expected - 1)).toBeLessThan(4e-16 + Math.abs(x) * 1.2e-16);
  });

  it('agrees with 64-digit arithmetic (mathjs) to 4e-16 from -708 to 709.7', () => {
    holds(numbers(-708, 709.7), (x) => {
      expect(relativeError(exponential(x), preciseExponential(x))).toBeLessThan(4e-16);
    });
  });

  it('agrees with 64-digit arithmetic near zero, where the kernel uses it most', () => {
    holds(numbers(-1, 1), (x) => {
      expect(relativeError(exponential(x), preciseExponential(x))).toBeLessThan(4e-16);
    });
  });

  it('keeps within one smallest number of the engine where results lose digits', () => {
    for (const x of [-709, -720, -740, -744, -745, -745.13]) {
      expect(Math.abs(exponential(x) - Math.exp(x))).toBeLessThanOrEqual(Number.MIN_VALUE);
    }
  });

  it.each([-745.2, -1000, -1e308, -Infinity])('is 0 at %d', (x) => {
    expect(exponential(x)).toBe(0);
  });

  it.each([709.79, 1000, Infinity])('is Infinity at %d', (x) => {
    expect(exponential(x)).toBe(Infinity);
  });

  it('is finite up to the largest number', () => {
    expect(exponential(709.78)).toBeGreaterThan(1.79e308);
    expect(exponential(709.78)).toBeLessThan(Infinity);
  });

  it('is not a number where its argument is not', () => {
    expect(exponential(NaN)).toBeNaN();
  });

  it('times that of the opposite is 1', () => {
    holds(numbers(-700, 700), (x) => {
      // two results of 4e-16 each and one product
      expect(exponential(x) * exponential(-x)).toBeCloseTo(1, 14);
    });
  });

  it('never falls as its argument grows', () => {
    holds(fc.tuple(numbers(-40, 40), numbers(1e-9, 1)), ([x, more]) => {
      expect(exponential(x + more)).toBeGreaterThan(exponential(x));
    });
  });
});
