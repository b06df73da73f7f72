import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import type { PlanPoint, Segment } from '../../../shared/geometry/point.ts';
import { stretchWithin, type Line } from '../../../shared/geometry/stretch-within.ts';
import { planPoints, segments } from '../../support/drawn-geometry.ts';
import {
  FAR_FROM_ORIGIN,
  motions,
  movePoint,
  moveSegment,
  turnDirection,
} from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const segment: Segment = { start: [0, 0], end: [10, 0] };

const lines: fc.Arbitrary<Line> = fc
  .tuple(planPoints, numbers(-Math.PI, Math.PI), numbers(0, 200))
  .map(([start, angle, length]) => ({
    start,
    direction: [Math.cos(angle), Math.sin(angle)],
    length,
  }));
const cases = fc.tuple(lines, segments, numbers(0.1, 80));

function pointOn({ start, direction }: Line, along: number): PlanPoint {
  return [start[0] + along * direction[0], start[1] + along * direction[1]];
}

function distanceAt(line: Line, along: number, of: Segment): number {
  return nearestOnSegment(pointOn(line, along), of).distance;
}

describe('stretchWithin', () => {
  it.each([
    ['along the segment, from end to end', [-20, 0], [1, 0], 50, 5, [15, 35]],
    ['beside it, within reach', [-20, 3], [1, 0], 50, 5, [16, 34]],
    ['beside it, at reach', [-20, 5], [1, 0], 50, 5, [20, 30]],
    ['across it', [5, -20], [0, 1], 50, 5, [15, 25]],
    ['across its round end', [13, -20], [0, 1], 50, 5, [16, 24]],
    ['touching its round end', [15, -20], [0, 1], 50, 5, [20, 20]],
    ['from inside', [5, 1], [1, 0], 3, 5, [0, 3]],
    ['from inside to outside', [5, 0], [0, 1], 50, 5, [0, 5]],
  ] as const)('%s', (_, [x, y], [ux, uy], length, reach, [from, to]) => {
    const line: Line = { start: [x, y], direction: [ux, uy], length };
    expect(stretchWithin(line, segment, reach)).toEqual([from, to]);
  });

  it.each([
    ['beside it, out of reach', [-20, 5.001], [1, 0], 50],
    ['towards it, too short', [5, -20], [0, 1], 14.9],
    ['away from it', [5, 6], [0, 1], 50],
    ['past its end', [15.001, -20], [0, 1], 50],
  ] as const)('%s: none', (_, [x, y], [ux, uy], length) => {
    const line: Line = { start: [x, y], direction: [ux, uy], length };
    expect(stretchWithin(line, segment, 5)).toBeUndefined();
  });

  it('of a segment of no length is within a circle', () => {
    const point: Segment = { start: [0, 0], end: [0, 0] };
    const line: Line = { start: [-10, 3], direction: [1, 0], length: 50 };
    expect(stretchWithin(line, point, 5)).toEqual([6, 14]);
  });

  it('of a line of no length is that point, or none', () => {
    const line: Line = { start: [5, 3], direction: [1, 0], length: 0 };
    expect(stretchWithin(line, segment, 5)).toEqual([0, 0]);
    expect(stretchWithin(line, segment, 2)).toBeUndefined();
  });

  it('crosses a slanting segment, by hand: half a width over the sine each side', () => {
    const slant: Segment = { start: [-30, -40], end: [30, 40] };
    const line: Line = { start: [-50, 0], direction: [1, 0], length: 100 };
    const [from, to] = stretchWithin(line, slant, 4) ?? [NaN, NaN];
    expect(from).toBeCloseTo(45, 12);
    expect(to).toBeCloseTo(55, 12);
  });

  it('is within reach all along, to 1e-6 m at its very ends', () => {
    holds(fc.tuple(cases, numbers(0, 1)), ([[line, of, reach], share]) => {
      const stretch = stretchWithin(line, of, reach);
      if (stretch === undefined) return;
      const [from, to] = stretch;
      expect(from).toBeGreaterThanOrEqual(0);
      expect(to).toBeLessThanOrEqual(line.length);
      for (const along of [from, to, from + share * (to - from)]) {
        // a root of (reach − off) is off by the root of rounding where the line only touches
        expect(distanceAt(line, along, of)).toBeLessThan(reach + 1e-6);
      }
    });
  });

  it('misses nothing: every place on the line within reach is in it', () => {
    holds(fc.tuple(cases, numbers(0, 1)), ([[line, of, reach], share]) => {
      const along = share * line.length;
      fc.pre(distanceAt(line, along, of) < reach - 1e-9);
      const [from, to] = stretchWithin(line, of, reach) ?? [NaN, NaN];
      expect(along).toBeGreaterThanOrEqual(from - 1e-6);
      expect(along).toBeLessThanOrEqual(to + 1e-6);
    });
  });

  it('is the same for the segment read backwards', () => {
    holds(cases, ([line, { start, end }, reach]) => {
      const [from, to] = stretchWithin(line, { start, end }, reach) ?? [NaN, NaN];
      // a line that only touches is in or out by rounding
      fc.pre(to - from > 1e-3);
      const back = stretchWithin(line, { start: end, end: start }, reach);
      expect(back?.[0]).toBeCloseTo(from, 6);
      expect(back?.[1]).toBeCloseTo(to, 6);
    });
  });

  it('grows with the reach', () => {
    holds(fc.tuple(cases, numbers(0.01, 10)), ([[line, of, reach], more]) => {
      const stretch = stretchWithin(line, of, reach);
      if (stretch === undefined) return;
      const [from, to] = stretch;
      const [widerFrom, widerTo] = stretchWithin(line, of, reach + more) ?? [NaN, NaN];
      expect(widerFrom).toBeLessThanOrEqual(from);
      expect(widerTo).toBeGreaterThanOrEqual(to);
    });
  });

  it('does not change when both move', () => {
    holds(fc.tuple(cases, motions), ([[line, of, reach], motion]) => {
      const moved: Line = {
        start: movePoint(motion, line.start),
        direction: turnDirection(motion, line.direction),
        length: line.length,
      };
      const [from, to] = stretchWithin(line, of, reach) ?? [NaN, NaN];
      const [movedFrom, movedTo] = stretchWithin(moved, moveSegment(motion, of), reach) ?? [
        NaN,
        NaN,
      ];
      // a line that only touches is in or out by rounding, and its ends by the root of rounding
      fc.pre(to - from > 0.1 && !Number.isNaN(movedFrom));
      expect(Math.abs(movedFrom - from)).toBeLessThan(1e4 * FAR_FROM_ORIGIN);
      expect(Math.abs(movedTo - to)).toBeLessThan(1e4 * FAR_FROM_ORIGIN);
    });
  });
});
