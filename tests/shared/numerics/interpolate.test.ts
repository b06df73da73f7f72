import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { interpolate } from '../../../shared/numerics/interpolate.ts';
import { holds, numbers } from '../../support/property.ts';

const ends = fc.tuple(numbers(-1e7, 1e7), numbers(-1e7, 1e7));

describe('interpolate', () => {
  it.each([
    [0, 10],
    [0.25, 12.5],
    [0.5, 15],
    [1, 20],
  ])('a share of %d between 10 and 20 is %d', (share, expected) => {
    expect(interpolate(10, 20, share)).toBe(expected);
  });

  it('gives both ends exactly', () => {
    holds(ends, ([from, to]) => {
      expect(interpolate(from, to, 0)).toBe(from);
      expect(interpolate(from, to, 1)).toBe(to);
    });
  });

  it('stays between the ends to one rounding', () => {
    holds(fc.tuple(ends, numbers(0, 1)), ([[from, to], share]) => {
      const value = interpolate(from, to, share);
      // two units in the last place of 2e7
      expect(value).toBeGreaterThanOrEqual(Math.min(from, to) - 8e-9);
      expect(value).toBeLessThanOrEqual(Math.max(from, to) + 8e-9);
    });
  });

  it('is the same from either side', () => {
    holds(fc.tuple(ends, numbers(0.51, 1)), ([[from, to], share]) => {
      expect(interpolate(to, from, 1 - share)).toBe(interpolate(from, to, share));
    });
  });
});
