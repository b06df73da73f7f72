import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { Segment } from '../../../shared/geometry/point.ts';
import { planPoints, segments } from '../../support/drawn-geometry.ts';
import { FAR_FROM_ORIGIN, motions, movePoint, moveSegment } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const segment: Segment = { start: [0, 0], end: [10, 0] };

describe('nearestOnSegment', () => {
  it.each([
    ['beside', [4, 3], 0.4, 3],
    ['before the start', [-3, 4], 0, 5],
    ['past the end', [13, -4], 1, 5],
    ['on it', [7, 0], 0.7, 0],
  ] as const)('%s', (_, [x, y], share, distance) => {
    expect(nearestOnSegment([x, y], segment)).toEqual({ share, distance });
  });

  it('takes a segment of no length as its start', () => {
    const point = { start: [1, 1], end: [1, 1] } as const;
    expect(nearestOnSegment([4, 5], point)).toEqual({ share: 0, distance: 5 });
  });

  it('is no farther off than any other point of the segment', () => {
    holds(fc.tuple(planPoints, segments, numbers(0, 1)), ([point, { start, end }, share]) => {
      const other = planDistance(point, [
        start[0] + share * (end[0] - start[0]),
        start[1] + share * (end[1] - start[1]),
      ]);
      // 1e-12: rounding of distances up to 400
      expect(nearestOnSegment(point, { start, end }).distance).toBeLessThan(other + 1e-12);
    });
  });

  it('moves with both', () => {
    holds(fc.tuple(planPoints, segments, motions), ([point, of, motion]) => {
      const here = nearestOnSegment(point, of);
      const there = nearestOnSegment(movePoint(motion, point), moveSegment(motion, of));
      expect(Math.abs(there.distance - here.distance)).toBeLessThan(FAR_FROM_ORIGIN);
    });
  });

  it('is the same distance from the segment read backwards', () => {
    holds(fc.tuple(planPoints, segments), ([point, { start, end }]) => {
      const there = nearestOnSegment(point, { start, end }).distance;
      expect(nearestOnSegment(point, { start: end, end: start }).distance).toBeCloseTo(there, 11);
    });
  });
});
