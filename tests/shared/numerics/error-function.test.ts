import jStat from 'jstat';
import { erf } from 'mathjs';
import { describe, expect, it } from 'vitest';
import {
  complementaryErrorFunction,
  errorFunction,
} from '../../../shared/numerics/error-function.ts';
import { preciseErf, preciseErfc, relativeError } from '../../support/high-precision.ts';
import { holds, numbers } from '../../support/property.ts';

describe('errorFunction', () => {
  // Abramowitz and Stegun 1964, table 7.1, set down from memory and confirmed by 60-digit arithmetic
  it.each([
    [0, 0],
    [0.5, 0.5204998778],
    [1, 0.8427007929],
    [1.5, 0.9661051465],
    [2, 0.995322265],
  ])('of %d is %d to ten digits', (x, expected) => {
    expect(errorFunction(x)).toBeCloseTo(expected, 10);
    expect(preciseErf(x).toNumber()).toBeCloseTo(expected, 10);
  });

  it('agrees with 60-digit arithmetic to 1e-15', () => {
    holds(numbers(-6, 6), (x) => {
      expect(Math.abs(errorFunction(x) - preciseErf(x).toNumber())).toBeLessThan(1e-15);
    });
  });

  it('agrees with mathjs and jstat to 1e-14', () => {
    holds(numbers(-6, 6), (x) => {
      expect(Math.abs(errorFunction(x) - erf(x))).toBeLessThan(1e-14);
      expect(Math.abs(errorFunction(x) - jStat.erf(x))).toBeLessThan(1e-14);
    });
  });

  it('is odd', () => {
    holds(numbers(0, 10), (x) => {
      expect(errorFunction(-x)).toBe(-errorFunction(x));
    });
  });

  it.each([7, 30, 1e10, Infinity])('is 1 at %d', (x) => {
    expect(errorFunction(x)).toBe(1);
    expect(errorFunction(-x)).toBe(-1);
  });

  it('keeps its digits near zero, where it is 2x/√π', () => {
    expect(errorFunction(1e-10) / 1e-10).toBeCloseTo(2 / Math.sqrt(Math.PI), 14);
  });
});

describe('complementaryErrorFunction', () => {
  it('keeps its digits in the upper tail: 1e-14 of itself up to 6', () => {
    holds(numbers(-3, 6), (x) => {
      expect(relativeError(complementaryErrorFunction(x), preciseErfc(x))).toBeLessThan(1e-14);
    });
  });

  it('keeps its digits on both sides of the change from series to fraction', () => {
    for (const x of [1.2, 1.2499999, 1.25, 1.2500001, 1.3, 2, 2.2, 2.25]) {
      expect(relativeError(complementaryErrorFunction(x), preciseErfc(x))).toBeLessThan(1e-14);
    }
  });

  it('and its mirror image make 2', () => {
    holds(numbers(-8, 8), (x) => {
      // one rounding of a number near 2
      expect(complementaryErrorFunction(x) + complementaryErrorFunction(-x)).toBeCloseTo(2, 15);
    });
  });

  it('is 1 less the error function', () => {
    holds(numbers(-6, 6), (x) => {
      expect(complementaryErrorFunction(x)).toBeCloseTo(1 - errorFunction(x), 15);
    });
  });

  it('runs out at 0 and 2', () => {
    expect(complementaryErrorFunction(40)).toBe(0);
    expect(complementaryErrorFunction(-40)).toBe(2);
  });
});
