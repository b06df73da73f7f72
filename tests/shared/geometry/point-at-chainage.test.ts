import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chainages } from '../../../shared/geometry/chainages.ts';
import { pointAtChainage } from '../../../shared/geometry/point-at-chainage.ts';
import type { SpacePoint } from '../../../shared/geometry/point.ts';
import { at } from '../../../shared/numerics/at.ts';
import { axes } from '../../support/drawn-geometry.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { FAR_FROM_ORIGIN, motions, movePoint, moveSpacePoint } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const axis: SpacePoint[] = [
  [0, 0, -20],
  [10, 0, -10],
  [10, 20, -30],
];
const along = chainages(axis);

describe('pointAtChainage', () => {
  it.each([
    [0, [0, 0, -20]],
    [5, [5, 0, -15]],
    [10, [10, 0, -10]],
    [20, [10, 10, -20]],
    [30, [10, 20, -30]],
  ])('at %d', (chainage, expected) => {
    expect(pointAtChainage(axis, along, chainage)).toEqual(expected);
  });

  it('keeps to the ends beyond them', () => {
    expect(pointAtChainage(axis, along, -7)).toEqual([0, 0, -20]);
    expect(pointAtChainage(axis, along, 1e9)).toEqual([10, 20, -30]);
  });

  it('refuses an axis of one point', () => {
    const refused = methodErrorOf(() => pointAtChainage([[0, 0, 0]], Float64Array.of(0), 0));
    expect(refused.code).toBe('outside-range');
  });

  it('passes exactly through every vertex', () => {
    holds(axes, (drawn) => {
      const of = chainages(drawn);
      for (const [k, vertex] of drawn.entries()) {
        expect(pointAtChainage(drawn, of, at(of, k))).toEqual(vertex);
      }
    });
  });

  it('lies as far from the start of its part as its chainage says', () => {
    holds(fc.tuple(axes, numbers(0, 1)), ([drawn, share]) => {
      const of = chainages(drawn);
      const chainage = share * at(of, drawn.length - 1);
      const point = pointAtChainage(drawn, of, chainage);
      const passed = [...of].filter((vertex) => vertex <= chainage).length - 1;
      const [x, y] = drawn[passed] ?? [NaN, NaN];
      const distance = Math.hypot(point[0] - x, point[1] - y);
      expect(distance).toBeCloseTo(chainage - at(of, passed), 10);
    });
  });

  it('moves with the axis', () => {
    holds(fc.tuple(axes, numbers(0, 1), motions), ([drawn, share, motion]) => {
      const of = chainages(drawn);
      const chainage = share * at(of, drawn.length - 1);
      const moved = drawn.map((vertex) => moveSpacePoint(motion, vertex));
      const [x, y, level] = pointAtChainage(drawn, of, chainage);
      const [movedX, movedY, movedLevel] = pointAtChainage(moved, chainages(moved), chainage);
      const wanted = movePoint(motion, [x, y]);
      // nine parts before it, each off by as much
      expect(Math.abs(movedX - wanted[0])).toBeLessThan(10 * FAR_FROM_ORIGIN);
      expect(Math.abs(movedY - wanted[1])).toBeLessThan(10 * FAR_FROM_ORIGIN);
      // gradients are up to 35 m in 5
      expect(Math.abs(movedLevel - level)).toBeLessThan(70 * FAR_FROM_ORIGIN);
    });
  });
});
