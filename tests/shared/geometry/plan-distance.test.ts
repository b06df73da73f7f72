import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import { planPoints } from '../../support/drawn-geometry.ts';
import { FAR_FROM_ORIGIN, motions, movePoint } from '../../support/plan-motion.ts';
import { holds } from '../../support/property.ts';

describe('planDistance', () => {
  it('of a 3-4-5 triangle', () => {
    expect(planDistance([1, 2], [4, 6])).toBe(5);
  });

  it('keeps its digits in a national grid', () => {
    expect(planDistance([500_003, 6_000_004], [500_000, 6_000_000])).toBe(5);
  });

  it('is the same there and back', () => {
    holds(fc.tuple(planPoints, planPoints), ([a, b]) => {
      expect(planDistance(b, a)).toBe(planDistance(a, b));
    });
  });

  it('does not change when both points move', () => {
    holds(fc.tuple(planPoints, planPoints, motions), ([a, b, motion]) => {
      const moved = planDistance(movePoint(motion, a), movePoint(motion, b));
      expect(Math.abs(moved - planDistance(a, b))).toBeLessThan(FAR_FROM_ORIGIN);
    });
  });

  it('is never longer by a detour', () => {
    holds(fc.tuple(planPoints, planPoints, planPoints), ([a, b, c]) => {
      // 1e-12: rounding of distances up to 600
      expect(planDistance(a, c)).toBeLessThan(planDistance(a, b) + planDistance(b, c) + 1e-12);
    });
  });
});
