import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chainages } from '../../../shared/geometry/chainages.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { at } from '../../../shared/numerics/at.ts';
import { axes } from '../../support/drawn-geometry.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { FAR_FROM_ORIGIN, motions, moveSpacePoint } from '../../support/plan-motion.ts';
import { holds } from '../../support/property.ts';

describe('chainages', () => {
  it('add up plan lengths', () => {
    const axis: PlanPoint[] = [
      [0, 0],
      [3, 4],
      [3, 14],
    ];
    expect([...chainages(axis)]).toEqual([0, 5, 15]);
  });

  it('leave levels out', () => {
    expect([...chainages([[0, 0, 0], [3, 4, 100]])]).toEqual([0, 5]); // prettier-ignore
  });

  it('of one vertex is 0', () => {
    expect([...chainages([[7, 7]])]).toEqual([0]);
  });

  it('name the vertex at fault', () => {
    const refused = methodErrorOf(() => chainages([[0, 0], [1, 0], [2, 0], [2, 0], [3, 0]])); // prettier-ignore
    expect(refused).toEqual({ code: 'zero-length', field: '[3]' });
  });

  it('keep their digits over a hundred thousand parts', () => {
    const axis = Array.from({ length: 100_001 }, (_, k): PlanPoint => [k / 10, 0]);
    // each length is off by at most one rounding of 1e4, and up as often as down
    expect(at(chainages(axis), 100_000)).toBeCloseTo(10_000, 9);
  });

  it('grow from 0', () => {
    holds(axes, (axis) => {
      const along = [...chainages(axis)];
      expect(along[0]).toBe(0);
      for (const [k, chainage] of along.slice(1).entries()) {
        expect(chainage).toBeGreaterThan(along[k] ?? Infinity);
      }
    });
  });

  it('do not change when the axis moves', () => {
    holds(fc.tuple(axes, motions), ([axis, motion]) => {
      const moved = chainages(axis.map((vertex) => moveSpacePoint(motion, vertex)));
      for (const [k, chainage] of [...chainages(axis)].entries()) {
        // each part may be off by as much
        expect(Math.abs(at(moved, k) - chainage)).toBeLessThan(axis.length * FAR_FROM_ORIGIN);
      }
    });
  });

  it('read backwards are what is left to the end', () => {
    holds(axes, (axis) => {
      const [there, back] = [chainages(axis), chainages([...axis].reverse())];
      const last = axis.length - 1;
      for (let k = 0; k <= last; k++) {
        expect(at(back, last - k)).toBeCloseTo(at(there, last) - at(there, k), 11);
      }
    });
  });
});
