import jStat from 'jstat';
import { describe, expect, it } from 'vitest';
import { normalDensity, SQRT_TWO_PI } from '../../../shared/numerics/normal-density.ts';
import { holds, numbers } from '../../support/property.ts';

describe('normalDensity', () => {
  it.each([
    [0, 0.3989422804014327],
    [1, 0.24197072451914337],
    [-2, 0.05399096651318806],
  ])('of %d is %d', (x, expected) => {
    expect(normalDensity(x)).toBeCloseTo(expected, 15);
  });

  it('has the root of 2π for its scale', () => {
    expect(SQRT_TWO_PI).toBe(Math.sqrt(2 * Math.PI));
  });

  it('agrees with jstat to 1e-15', () => {
    holds(numbers(-10, 10), (x) => {
      expect(Math.abs(normalDensity(x) - jStat.normal.pdf(x, 0, 1))).toBeLessThan(1e-15);
    });
  });

  it('is even', () => {
    holds(numbers(0, 40), (x) => {
      expect(normalDensity(-x)).toBe(normalDensity(x));
    });
  });

  it('is steepest at one, where its curvature changes sign', () => {
    const h = 1e-3;
    const bend = normalDensity(1 + h) - 2 * normalDensity(1) + normalDensity(1 - h);
    // the odd third derivative cancels; the fourth leaves h⁴/12 · 2φ(1)
    expect(Math.abs(bend)).toBeLessThan(1e-12);
  });
});
