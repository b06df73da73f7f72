import { sin } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { sine } from '../../../shared/numerics/sine.ts';
import { holds, numbers } from '../../support/property.ts';

describe('sine', () => {
  it.each([
    [0, 0],
    [Math.PI / 6, 0.5],
    [Math.PI / 4, Math.SQRT1_2],
    [Math.PI / 2, 1],
    [Math.PI, 0],
    [Math.PI / 36, 0.08715574274765817],
  ])('of %d is %d', (x, expected) => {
    expect(Math.abs(sine(x) - expected)).toBeLessThan(2e-15);
  });

  it('agrees with mathjs to 2e-15 in the whole circle', () => {
    holds(numbers(-Math.PI, Math.PI), (x) => {
      expect(Math.abs(sine(x) - sin(x))).toBeLessThan(2e-15);
    });
  });

  it('is odd', () => {
    holds(numbers(0, Math.PI), (x) => {
      expect(sine(-x)).toBe(-sine(x));
    });
  });

  it('doubles its angle as 2 sin cos', () => {
    holds(numbers(0, Math.PI / 2), (x) => {
      const cosine = sine(Math.PI / 2 - x);
      // two results of 2e-15 each
      expect(Math.abs(sine(2 * x) - 2 * sine(x) * cosine)).toBeLessThan(1e-14);
    });
  });
});
