import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import { pointInPolygon } from '../../../shared/geometry/point-in-polygon.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { polygonEdges } from '../../../shared/geometry/polygon-edges.ts';
import { planPoints, rings } from '../../support/drawn-geometry.ts';
import { motions, movePoint } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const square: PlanPoint[] = [[0, 0], [10, 0], [10, 10], [0, 10]]; // prettier-ignore
const court: PlanPoint[] = [[3, 3], [7, 3], [7, 7], [3, 7]]; // prettier-ignore
const ell: PlanPoint[] = [[0, 0], [6, 0], [6, 2], [2, 2], [2, 5], [0, 5]]; // prettier-ignore

const near = fc.tuple(numbers(-30, 30), numbers(-30, 30)).map(([x, y]): PlanPoint => [x, y]);

function distanceToEdges(point: PlanPoint, ring: readonly PlanPoint[]): number {
  return Math.min(...polygonEdges(ring).map((edge) => nearestOnSegment(point, edge).distance));
}

/** How often a ring goes round a point, by adding up angles. */
function turnsRound([x, y]: PlanPoint, ring: readonly PlanPoint[]): number {
  let angle = 0;
  for (const { start, end } of polygonEdges(ring)) {
    const [ax, ay, bx, by] = [start[0] - x, start[1] - y, end[0] - x, end[1] - y];
    angle += Math.atan2(ax * by - ay * bx, ax * bx + ay * by);
  }
  return Math.round(angle / (2 * Math.PI));
}

describe('pointInPolygon', () => {
  it.each([
    [[5, 5], true],
    [[11, 5], false],
    [[-1, 5], false],
    [[5, 11], false],
    [[5, -1], false],
    [[0.001, 9.999], true],
  ] as const)('%j in a square is %s', ([x, y], expected) => {
    expect(pointInPolygon([x, y], [square])).toBe(expected);
  });

  it.each([
    [[1, 4], true],
    [[5, 1], true],
    [[4, 4], false],
  ] as const)('%j in an L is %s', ([x, y], expected) => {
    expect(pointInPolygon([x, y], [ell])).toBe(expected);
  });

  it('leaves holes out, whichever way they run', () => {
    for (const hole of [court, [...court].reverse()]) {
      expect(pointInPolygon([5, 5], [square, hole])).toBe(false);
      expect(pointInPolygon([1, 5], [square, hole])).toBe(true);
    }
  });

  it('takes an island in a hole in', () => {
    const island: PlanPoint[] = [[4, 4], [6, 4], [6, 6], [4, 6]]; // prettier-ignore
    expect(pointInPolygon([5, 5], [square, court, island])).toBe(true);
  });

  it('is not confused by a vertex level with the point', () => {
    const diamond: PlanPoint[] = [[0, -5], [5, 0], [0, 5], [-5, 0]]; // prettier-ignore
    expect(pointInPolygon([0, 0], [diamond])).toBe(true);
    expect(pointInPolygon([-6, 0], [diamond])).toBe(false);
    expect(pointInPolygon([6, 0], [diamond])).toBe(false);
    expect(pointInPolygon([-7, 5], [diamond])).toBe(false);
  });

  it('is false where there is no ring', () => {
    expect(pointInPolygon([0, 0], [])).toBe(false);
    expect(pointInPolygon([0, 0], [[]])).toBe(false);
  });

  it('agrees with the sum of angles', () => {
    holds(fc.tuple(rings, near), ([ring, point]) => {
      fc.pre(distanceToEdges(point, ring) > 1e-6);
      expect(pointInPolygon(point, [ring])).toBe(turnsRound(point, ring) !== 0);
    });
  });

  it('agrees with the sum of angles in rings that cross themselves', () => {
    const tangles = fc.array(planPoints, { minLength: 3, maxLength: 7 });
    holds(fc.tuple(tangles, near), ([ring, point]) => {
      fc.pre(distanceToEdges(point, ring) > 1e-6);
      expect(pointInPolygon(point, [ring])).toBe(turnsRound(point, ring) % 2 !== 0);
    });
  });

  it('does not change when both move, or when the ring is read backwards', () => {
    holds(fc.tuple(rings, near, motions), ([ring, point, motion]) => {
      fc.pre(distanceToEdges(point, ring) > 1e-6);
      const inside = pointInPolygon(point, [ring]);
      const moved = ring.map((vertex) => movePoint(motion, vertex));
      expect(pointInPolygon(movePoint(motion, point), [moved])).toBe(inside);
      expect(pointInPolygon(point, [[...ring].reverse()])).toBe(inside);
    });
  });
});
