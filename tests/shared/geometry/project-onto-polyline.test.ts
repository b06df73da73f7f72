import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chainages } from '../../../shared/geometry/chainages.ts';
import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import { polylineParts } from '../../../shared/geometry/polyline-parts.ts';
import { pointAtChainage } from '../../../shared/geometry/point-at-chainage.ts';
import type { PlanPoint, SpacePoint } from '../../../shared/geometry/point.ts';
import { projectOntoPolyline } from '../../../shared/geometry/project-onto-polyline.ts';
import { at } from '../../../shared/numerics/at.ts';
import { axes, planPoints } from '../../support/drawn-geometry.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { FAR_FROM_ORIGIN, motions, movePoint, moveSpacePoint } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const bend: PlanPoint[] = [
  [0, 0],
  [10, 0],
  [10, 20],
];
/** Turns left by 135 degrees. */
const hairpin: PlanPoint[] = [
  [0, 0],
  [10, 0],
  [0, 10],
];

function project(
  point: PlanPoint,
  axis: readonly PlanPoint[],
): { chainage: number; offset: number } {
  return projectOntoPolyline(point, axis, chainages(axis));
}

describe('projectOntoPolyline', () => {
  it.each([
    ['left of the first part', [4, 3], 4, 3],
    ['right of the first part', [4, -3], 4, -3],
    ['left of the second part', [8, 12], 22, 2],
    ['right of the second part', [15, 12], 22, -5],
    ['outside the bend, nearest to the vertex', [13, -4], 10, -5],
    ['on the line', [10, 5], 15, 0],
    ['on the vertex', [10, 0], 10, 0],
    ['behind the start, on its left', [-3, 4], 0, 5],
    ['behind the start, on its right', [-3, -4], 0, -5],
    ['straight behind the start', [-2, 0], 0, 2],
    ['past the end, on its left', [7, 24], 30, 5],
    ['past the end, on its right', [13, 24], 30, -5],
  ] as const)('%s', (_, [x, y], chainage, offset) => {
    expect(project([x, y], bend)).toEqual({ chainage, offset });
  });

  it('is on the outer side all round a sharp bend, even left of the second part', () => {
    // (12, 1) is left of the first part, (9, -1) right of it; both are outside the turn
    expect(project([12, 1], hairpin).offset).toBeCloseTo(-Math.sqrt(5), 14);
    expect(project([12, -1], hairpin).offset).toBeCloseTo(-Math.sqrt(5), 14);
    expect(project([11, 0], hairpin)).toEqual({ chainage: 10, offset: -1 });
  });

  it('takes the first of places equally near', () => {
    expect(project([5, 5], [[0, 0], [10, 0], [10, 10]])).toEqual({ chainage: 5, offset: 5 }); // prettier-ignore
  });

  it('leaves levels out', () => {
    const axis: SpacePoint[] = [
      [0, 0, -50],
      [10, 0, 50],
    ];
    expect(projectOntoPolyline([4, 3], axis, chainages(axis))).toEqual({ chainage: 4, offset: 3 });
  });

  it('refuses an axis of one point', () => {
    expect(methodErrorOf(() => project([0, 0], [[1, 1]])).code).toBe('outside-range');
  });

  it('is at the distance of the nearest part, and the point at its chainage is there', () => {
    holds(fc.tuple(axes, planPoints), ([axis, point]) => {
      const of = chainages(axis);
      const { chainage, offset } = projectOntoPolyline(point, axis, of);
      const nearest = Math.min(
        ...polylineParts(axis).map((part) => nearestOnSegment(point, part).distance),
      );
      expect(Math.abs(offset)).toBe(nearest);
      const [x, y] = pointAtChainage(axis, of, chainage);
      expect(Math.hypot(x - point[0], y - point[1])).toBeCloseTo(nearest, 10);
    });
  });

  it('is on the outer side of any hairpin, wherever the grid is', () => {
    const turns = fc.tuple(numbers(1.7, 3), fc.constantFrom(1, -1));
    holds(fc.tuple(turns, numbers(0.05, 0.95), motions), ([[turn, side], share, motion]) => {
      const direction = side * turn;
      const [x, y] = [29.7, 7.1];
      const axis: PlanPoint[] = [
        [x - 50, y],
        [x, y],
        [x + 50 * Math.cos(direction), y + 50 * Math.sin(direction)],
      ];
      // the wedge of points nearest to the vertex, between the normals of the parts on the outer side
      const towards = side * (-Math.PI / 2 + share * turn);
      const point: PlanPoint = [x + 7 * Math.cos(towards), y + 7 * Math.sin(towards)];
      const moved = axis.map((vertex) => movePoint(motion, vertex));
      const { chainage, offset } = project(movePoint(motion, point), moved);
      expect(chainage).toBeCloseTo(50, 7);
      expect(offset).toBeCloseTo(-7 * side, 7);
    });
  });

  it('finds again what was set out square to a part', () => {
    holds(fc.tuple(axes, numbers(0.2, 0.8), numbers(-0.2, 0.2)), ([axis, share, offset]) => {
      const [part] = polylineParts(axis);
      if (part === undefined) throw new Error('an axis has parts');
      // within 0.2 m of the middle of the first part nothing else is nearer, unless the axis returns
      const [ux, uy] = part.direction;
      const along = share * part.length;
      const point: PlanPoint = [
        part.start[0] + along * ux - offset * uy,
        part.start[1] + along * uy + offset * ux,
      ];
      const others = polylineParts(axis).slice(1);
      fc.pre(others.every((other) => nearestOnSegment(point, other).distance > Math.abs(offset)));
      const found = projectOntoPolyline(point, axis, chainages(axis));
      expect(found.chainage).toBeCloseTo(along, 10);
      expect(found.offset).toBeCloseTo(offset, 10);
    });
  });

  it('changes side when the axis is read backwards, except straight behind', () => {
    holds(fc.tuple(axes, planPoints), ([axis, point]) => {
      const there = projectOntoPolyline(point, axis, chainages(axis));
      const reversed = [...axis].reverse();
      const of = chainages(reversed);
      const back = projectOntoPolyline(point, reversed, of);
      expect(Math.abs(back.offset)).toBeCloseTo(Math.abs(there.offset), 10);
      const rest = at(of, reversed.length - 1) - back.chainage;
      // elsewhere two places are equally near, which the two readings choose between
      fc.pre(Math.abs(rest - there.chainage) < 1e-9 && Math.abs(there.offset) > 1e-9);
      expect(Math.sign(back.offset)).toBe(-Math.sign(there.offset));
    });
  });

  it('moves with the axis', () => {
    holds(fc.tuple(axes, planPoints, motions), ([axis, point, motion]) => {
      const moved = axis.map((vertex) => moveSpacePoint(motion, vertex));
      const here = projectOntoPolyline(point, axis, chainages(axis));
      const there = projectOntoPolyline(movePoint(motion, point), moved, chainages(moved));
      const difference = Math.abs(Math.abs(there.offset) - Math.abs(here.offset));
      expect(difference).toBeLessThan(FAR_FROM_ORIGIN);
    });
  });
});
