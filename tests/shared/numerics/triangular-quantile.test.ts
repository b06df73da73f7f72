import { describe, expect, it } from 'vitest';
import { certain } from '../../../shared/numerics/range.ts';
import { triangularQuantile } from '../../../shared/numerics/triangular-quantile.ts';

const RANGE = { low: 1, central: 2, high: 5 };

/** The triangular distribution by its own formula. */
function distribution(x: number): number {
  return x < 2 ? (x - 1) ** 2 / 4 : 1 - (5 - x) ** 2 / 12;
}

describe('triangularQuantile', () => {
  it('goes from the low end over the central value to the high end', () => {
    expect([0, 0.25, 1].map((share) => triangularQuantile(RANGE, share))).toEqual([1, 2, 5]);
  });

  it('is the inverse of the distribution', () => {
    for (let share = 0.01; share < 1; share += 0.01) {
      expect(distribution(triangularQuantile(RANGE, share))).toBeCloseTo(share, 12);
    }
  });

  it('may have its peak at an end', () => {
    expect(triangularQuantile({ low: 1, central: 1, high: 3 }, 0.75)).toBe(2);
    expect(triangularQuantile({ low: 1, central: 3, high: 3 }, 0.25)).toBe(2);
  });

  it('has one value where the range has no width', () => {
    expect(triangularQuantile(certain(0.5), 0.9)).toBe(0.5);
  });
});
