import jStat from 'jstat';
import { describe, expect, it } from 'vitest';
import { MethodError } from '../../../shared/method-error.ts';
import { normalDistribution } from '../../../shared/numerics/normal-distribution.ts';
import { normalQuantile } from '../../../shared/numerics/normal-quantile.ts';
import { holds, numbers } from '../../support/property.ts';

describe('normalQuantile', () => {
  it.each([
    [0.5, 0],
    [0.975, 1.959963984540054],
    [0.05, -1.6448536269514722],
    [0.275, -0.5977601260424782],
  ])('of %d is %d', (p, expected) => {
    expect(normalQuantile(p)).toBeCloseTo(expected, 9);
  });

  it('puts the face of a closed machine 0.598 widths off, as the method says', () => {
    expect(Math.abs(normalQuantile(0.275))).toBeCloseTo(0.598, 3);
  });

  it('agrees with jstat to 1e-9', () => {
    holds(numbers(0.001, 0.999), (p) => {
      expect(Math.abs(normalQuantile(p) - jStat.normal.inv(p, 0, 1))).toBeLessThan(1e-9);
    });
  });

  it('undoes the distribution', () => {
    holds(numbers(-3, 3), (x) => {
      // an error of 1e-15 in Φ over φ(3) = 0.0044
      expect(normalQuantile(normalDistribution(x))).toBeCloseTo(x, 11);
    });
  });

  it('is odd about one half', () => {
    holds(numbers(0.001, 0.5), (p) => {
      expect(normalQuantile(1 - p)).toBeCloseTo(-normalQuantile(p), 10);
    });
  });

  it('reaches out to 1e-12', () => {
    expect(normalQuantile(1e-12)).toBeCloseTo(-7.0345, 3);
    expect(normalQuantile(1 - 1e-12)).toBeCloseTo(7.0345, 3);
  });

  it.each([0, 1, -0.1, 1.1, NaN])('refuses %d', (p) => {
    expect(() => normalQuantile(p)).toThrow(MethodError);
  });
});
