import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import type { Segment } from '../../../shared/geometry/point.ts';
import { segmentDistance, segmentsCross } from '../../../shared/geometry/segment-distance.ts';
import { segments } from '../../support/drawn-geometry.ts';
import { FAR_FROM_ORIGIN, motions, moveSegment } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const base: Segment = { start: [0, 0], end: [10, 0] };

describe('segmentsCross', () => {
  it.each([
    ['across', { start: [5, -1], end: [5, 1] }, true],
    ['short of it', { start: [5, 1], end: [5, 2] }, false],
    ['touching with its end', { start: [5, 0], end: [5, 2] }, false],
    ['past its end', { start: [11, -1], end: [11, 1] }, false],
    ['along it', { start: [2, 0], end: [5, 0] }, false],
  ] as [string, Segment, boolean][])('%s', (_, other, expected) => {
    expect(segmentsCross(base, other)).toBe(expected);
    expect(segmentsCross(other, base)).toBe(expected);
  });
});

describe('segmentDistance', () => {
  it.each([
    ['where they cross', { start: [5, -1], end: [5, 1] }, 0],
    ['where they touch', { start: [5, 0], end: [5, 2] }, 0],
    ['side by side', { start: [2, 3], end: [8, 3] }, 3],
    ['end to end', { start: [13, 4], end: [20, 4] }, 5],
    ['one along the other', { start: [2, 0], end: [5, 0] }, 0],
    ['a point', { start: [4, 7], end: [4, 7] }, 7],
  ] as [string, Segment, number][])('%s', (_, other, expected) => {
    expect(segmentDistance(base, other)).toBe(expected);
  });

  it('is the same both ways and read backwards', () => {
    holds(fc.tuple(segments, segments), ([a, b]) => {
      const distance = segmentDistance(a, b);
      expect(segmentDistance(b, a)).toBeCloseTo(distance, 11);
      expect(segmentDistance({ start: a.end, end: a.start }, b)).toBeCloseTo(distance, 11);
    });
  });

  it('is no more than from any point of one to the other, and reached', () => {
    holds(fc.tuple(segments, segments, numbers(0, 1)), ([a, b, share]) => {
      const distance = segmentDistance(a, b);
      const point = [
        a.start[0] + share * (a.end[0] - a.start[0]),
        a.start[1] + share * (a.end[1] - a.start[1]),
      ] as const;
      // 1e-12: rounding of distances up to 400
      expect(distance).toBeLessThan(nearestOnSegment(point, b).distance + 1e-12);
    });
  });

  it('does not change when both move', () => {
    holds(fc.tuple(segments, segments, motions), ([a, b, motion]) => {
      const moved = segmentDistance(moveSegment(motion, a), moveSegment(motion, b));
      expect(Math.abs(moved - segmentDistance(a, b))).toBeLessThan(FAR_FROM_ORIGIN);
    });
  });
});
