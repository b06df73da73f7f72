import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { polylineParts } from '../../../shared/geometry/polyline-parts.ts';
import { straightRunEnd } from '../../../shared/geometry/straight-run-end.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { motions, movePoint } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';
import { keepsTo } from '../../support/straightness.ts';

const TOLERANCE = { angle: Math.PI / 36, offset: 0.5 };

/** A line of parts of 2 to 10 m that each turn a little. */
const wanderings = fc
  .array(fc.tuple(numbers(2, 10), numbers(-0.15, 0.15)), { minLength: 1, maxLength: 12 })
  .map((steps): PlanPoint[] => {
    let [x, y, heading] = [0, 0, 0];
    const points: PlanPoint[] = [[0, 0]];
    for (const [length, turn] of steps) {
      heading += turn;
      points.push([(x += length * Math.cos(heading)), (y += length * Math.sin(heading))]);
    }
    return points;
  });

function endOf(points: readonly PlanPoint[]): number {
  return straightRunEnd(polylineParts(points), 0, points.length - 2, TOLERANCE);
}

describe('straightRunEnd', () => {
  it('of parts on a line is the last', () => {
    expect(endOf([[0, 0], [5, 0], [10, 0], [15, 0]])).toBe(2); // prettier-ignore
  });

  it('stops at a corner', () => {
    expect(endOf([[0, 0], [5, 0], [10, 0], [10, 5]])).toBe(1); // prettier-ignore
  });

  it('stops where a vertex would be off the line, though the turns are small', () => {
    // 0.6 m off the line at 20 m, with turns of 1.7 degrees each side
    expect(endOf([[0, 0], [20, 0.6], [40, 0]])).toBe(0); // prettier-ignore
    expect(endOf([[0, 0], [20, 0.49], [40, 0]])).toBe(1); // prettier-ignore
  });

  it('stops where a part would turn too far, though it keeps near the line', () => {
    expect(endOf([[0, 0], [2, 0.2], [4, 0], [6, 0.2], [8, 0]])).toBe(0); // prettier-ignore
    expect(endOf([[0, 0], [2, 0.17], [4, 0], [6, 0.17], [8, 0]])).toBe(3); // prettier-ignore
  });

  it('goes on past a place where the run would not end straight', () => {
    // after two parts the line turns by 0.44 from the second; after all three it lies flat
    const points: PlanPoint[] = [[0, 0], [5, 0], [6, 0.08], [20, 0]]; // prettier-ignore
    expect(endOf(points)).toBe(2);
  });

  it('does not fold back', () => {
    expect(endOf([[0, 0], [5, 0], [0.4, 0.01]])).toBe(0); // prettier-ignore
  });

  it('starts and stops where it is told to', () => {
    const parts = polylineParts([[0, 5], [0, 0], [5, 0], [10, 0], [15, 0]]); // prettier-ignore
    expect(straightRunEnd(parts, 1, 2, TOLERANCE)).toBe(2);
    expect(straightRunEnd(parts, 0, 3, TOLERANCE)).toBe(0);
  });

  it('takes gaps between parts that are within the offset', () => {
    const parts = [
      ...polylineParts([[0, 0], [5, 0]]), // prettier-ignore
      ...polylineParts([[5.3, 0.2], [10, 0.2]]), // prettier-ignore
    ];
    expect(straightRunEnd(parts, 0, 1, TOLERANCE)).toBe(1);
  });

  it('stops where a part starts, or ends, off the line, beside a gap', () => {
    const startsOff = [
      ...polylineParts([
        [0, 0],
        [10, 0],
      ]),
      ...polylineParts([
        [10, 0.7],
        [30, 0],
      ]),
    ];
    const endsOff = [
      ...polylineParts([
        [0, 0],
        [10, 0.7],
      ]),
      ...polylineParts([
        [10, 0],
        [30, 0],
      ]),
    ];
    expect(straightRunEnd(startsOff, 0, 1, TOLERANCE)).toBe(0);
    expect(straightRunEnd(endsOff, 0, 1, TOLERANCE)).toBe(0);
  });

  it.each([
    { angle: 0, offset: 1 },
    { angle: 1, offset: 1 },
    { angle: 0.1, offset: 0 },
    { angle: NaN, offset: 1 },
  ])('refuses %j', (tolerance) => {
    const parts = polylineParts([[0, 0], [1, 0]]); // prettier-ignore
    expect(methodErrorOf(() => straightRunEnd(parts, 0, 0, tolerance)).code).toBe('outside-range');
  });

  it('keeps to its tolerance, and no longer run does', () => {
    holds(
      wanderings,
      (points) => {
        const parts = polylineParts(points);
        const end = straightRunEnd(parts, 0, parts.length - 1, TOLERANCE);
        expect(keepsTo(parts.slice(0, end + 1), TOLERANCE)).toBe(true);
        for (let k = end + 1; k < parts.length; k++) {
          // a millionth tighter, as rounding may decide on the limit itself
          const tighter = {
            angle: TOLERANCE.angle * (1 - 1e-5),
            offset: TOLERANCE.offset * (1 - 1e-5),
          };
          expect(keepsTo(parts.slice(0, k + 1), tighter)).toBe(false);
        }
      },
      1000,
    );
  });

  it('does not change when the parts move', () => {
    holds(fc.tuple(wanderings, motions), ([points, motion]) => {
      expect(endOf(points.map((point) => movePoint(motion, point)))).toBe(endOf(points));
    });
  });
});
