import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { stepsOf } from '../../../shared/geometry/steps-of.ts';
import { holds, numbers } from '../../support/property.ts';

describe('stepsOf', () => {
  it.each([
    [10, 2.5, 4],
    [10, 3, 4],
    [10, 10, 1],
    [10, 11, 1],
    [0, 1, 1],
    [10 * (1 + 1e-15), 2.5, 4],
    [10.0001, 2.5, 5],
  ])('%d in steps of %d at most is %d', (length, longest, expected) => {
    expect(stepsOf(length, longest)).toBe(expected);
  });

  it('makes no step longer than wanted, and one fewer would be longer', () => {
    holds(fc.tuple(numbers(0.1, 1000), numbers(0.1, 50)), ([length, longest]) => {
      const steps = stepsOf(length, longest);
      expect(length / steps).toBeLessThanOrEqual(longest * (1 + 1e-9));
      if (steps > 1) expect(length / (steps - 1)).toBeGreaterThan(longest);
    });
  });
});
