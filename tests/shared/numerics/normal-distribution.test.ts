import jStat from 'jstat';
import { erf } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { normalDensity } from '../../../shared/numerics/normal-density.ts';
import { normalDistribution } from '../../../shared/numerics/normal-distribution.ts';
import { preciseErfc } from '../../support/high-precision.ts';
import { holds, numbers } from '../../support/property.ts';

describe('normalDistribution', () => {
  // well-known values, each confirmed below by mathjs and 60-digit arithmetic
  it.each([
    [0, 0.5],
    [1, 0.841344746068543],
    [1.96, 0.97500210485178],
    [-1.6448536269514722, 0.05],
    [3, 0.99865010196837],
  ])('of %d is %d', (x, expected) => {
    expect(normalDistribution(x)).toBeCloseTo(expected, 14);
  });

  it('agrees with mathjs to 1e-14', () => {
    holds(numbers(-10, 10), (x) => {
      const wanted = (1 + erf(x * Math.SQRT1_2)) / 2;
      expect(Math.abs(normalDistribution(x) - wanted)).toBeLessThan(1e-14);
    });
  });

  it('agrees with jstat to 1e-14', () => {
    holds(numbers(-10, 10), (x) => {
      expect(Math.abs(normalDistribution(x) - jStat.normal.cdf(x, 0, 1))).toBeLessThan(1e-14);
    });
  });

  it('agrees with 60-digit arithmetic to 1e-15', () => {
    holds(numbers(-8, 8), (x) => {
      const wanted = preciseErfc(-x * Math.SQRT1_2).toNumber() / 2;
      expect(Math.abs(normalDistribution(x) - wanted)).toBeLessThan(1e-15);
    });
  });

  it('and its mirror image make 1', () => {
    holds(numbers(-9, 9), (x) => {
      expect(normalDistribution(x) + normalDistribution(-x)).toBeCloseTo(1, 15);
    });
  });

  it('grows as the density says', () => {
    holds(numbers(-5, 5), (x) => {
      const h = 1e-4;
      const slope = (normalDistribution(x + h) - normalDistribution(x - h)) / (2 * h);
      // h²/6 of the second derivative of φ, which is under 0.4, and 1e-16/h of rounding
      expect(Math.abs(slope - normalDensity(x))).toBeLessThan(1e-9);
    });
  });

  it('runs from 0 to 1', () => {
    expect(normalDistribution(-40)).toBe(0);
    expect(normalDistribution(40)).toBe(1);
  });
});
