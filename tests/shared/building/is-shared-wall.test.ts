import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isSharedWall } from '../../../shared/building/is-shared-wall.ts';
import { ROW_TOLERANCE } from '../../../shared/building/row-tolerance.ts';
import type { Segment } from '../../../shared/geometry/point.ts';
import { polylineParts } from '../../../shared/geometry/polyline-parts.ts';
import { motions, moveSegment } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const wall: Segment = { start: [0, 0], end: [10, 0] };

function shared(a: Segment, b: Segment): boolean {
  const [one] = polylineParts([a.start, a.end]);
  const [other] = polylineParts([b.start, b.end]);
  if (one === undefined || other === undefined) throw new Error('walls have length');
  return isSharedWall(one, other, ROW_TOLERANCE);
}

function turned({ start, end }: Segment): Segment {
  return { start: end, end: start };
}

describe('isSharedWall', () => {
  it.each([
    ['the same wall', { start: [0, 0], end: [10, 0] }, true],
    ['part of it', { start: [4, 0], end: [6, 0] }, true],
    ['0.5 m away', { start: [2, 0.5], end: [8, 0.5] }, true],
    ['0.51 m away', { start: [2, 0.51], end: [8, 0.51] }, false],
    ['past its end by all but 0.6 m', { start: [9.4, 0], end: [20, 0] }, true],
    ['past its end by all but 0.5 m', { start: [9.5, 0], end: [20, 0] }, false],
    ['end to end', { start: [10, 0], end: [20, 0] }, false],
    ['at 4 degrees across it', { start: [3, -0.14], end: [7, 0.14] }, true],
    ['at 6 degrees across it', { start: [3, -0.21], end: [7, 0.21] }, false],
    ['at 4 degrees, 0.7 m off where they end together', { start: [0, 0], end: [10, 0.7] }, false],
    ['square to it', { start: [5, 0], end: [5, 10] }, false],
    ['shorter than the overlap', { start: [5, 0], end: [5.4, 0] }, false],
    ['leaving it beyond its end only', { start: [5, 0], end: [25, 1.6] }, true],
  ] as [string, Segment, boolean][])('%s', (_, other, expected) => {
    expect(shared(wall, other)).toBe(expected);
    expect(shared(other, wall)).toBe(expected);
    expect(shared(wall, turned(other))).toBe(expected);
    expect(shared(turned(wall), other)).toBe(expected);
  });

  it('does not change when both move', () => {
    const others = fc.tuple(numbers(-5, 12), numbers(-0.7, 0.7), numbers(-0.12, 0.12));
    holds(fc.tuple(others, numbers(1, 9), motions), ([[x, y, angle], length, motion]) => {
      const [dx, dy] = [length * Math.cos(angle), length * Math.sin(angle)];
      const other: Segment = { start: [x, y], end: [x + dx, y + dy] };
      const moved = shared(moveSegment(motion, wall), moveSegment(motion, other));
      expect(moved).toBe(shared(wall, other));
    });
  });
});
