import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { monotoneRoot } from '../../../shared/numerics/monotone-root.ts';
import { fromRoots } from '../../support/polynomial.ts';
import { holds, numbers } from '../../support/property.ts';

describe('monotoneRoot', () => {
  it('finds where a straight line passes a level', () => {
    expect(monotoneRoot(Float64Array.of(1, 2), 0, 1, 2, 0, 1)).toBe(0.5);
  });

  it('finds it in a falling polynomial too', () => {
    expect(monotoneRoot(Float64Array.of(1, -2), 0, 1, 0.5, 0, 1)).toBe(0.25);
  });

  it('reads its coefficients where it is told to', () => {
    expect(monotoneRoot(Float64Array.of(9, 9, -1, 4), 2, 1, 0, 0, 1)).toBe(0.25);
  });

  it('finds the root of two from t²', () => {
    const t = monotoneRoot(Float64Array.of(0, 0, 1), 0, 2, 2, 0, 2);
    expect(t).toBeCloseTo(Math.SQRT2, 14);
  });

  it('finds a root of high order as well as rounding lets it', () => {
    // (t − 0.3)⁵ is under 1e-17, all rounding, within 4e-4 of its root
    const t = monotoneRoot(fromRoots(1, [0.3, 0.3, 0.3, 0.3, 0.3]), 0, 5, 0, 0, 1);
    expect(Math.abs(t - 0.3)).toBeLessThan(2e-3);
  });

  it('finds the one root of any rising quintic to 1e-14', () => {
    const parts = fc.tuple(numbers(0.01, 0.99), numbers(0.1, 5), numbers(0, 5), numbers(0, 5));
    holds(parts, ([root, slope, cube, fifth]) => {
      const [one, three, five] = [
        fromRoots(slope, [root]),
        fromRoots(cube, [root, root, root]),
        fromRoots(fifth, [root, root, root, root, root]),
      ];
      const c = five.map((value, k) => value + (three[k] ?? 0) + (one[k] ?? 0));
      // values round to 1e-16 of coefficients up to 60, over a slope of 0.1 at least
      const found = monotoneRoot(c, 0, 5, 0, 0, 1);
      expect(Math.abs(found - root)).toBeLessThan(1e-14 + (1e-15 * (cube + 10 * fifth)) / slope);
    });
  });
});
