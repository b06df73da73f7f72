import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { commonFan, fanAround, fanHolds } from '../../../shared/geometry/direction-fan.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { holds, numbers } from '../../support/property.ts';

function towards(angle: number): PlanPoint {
  return [Math.cos(angle), Math.sin(angle)];
}

/** A fan by its middle and half its width, under a right angle. */
const fans = fc.record({ middle: numbers(-Math.PI, Math.PI), half: numbers(0.01, 1.5) });

/** The turn between two directions, at most half a circle. */
function turnBetween(a: number, b: number): number {
  return Math.abs(Math.atan2(Math.sin(b - a), Math.cos(b - a)));
}

describe('fanAround', () => {
  it('east by 30 degrees runs from −30 to 30 degrees', () => {
    const { right, left } = fanAround([1, 0], 0.5);
    expect(right[0]).toBeCloseTo(Math.sqrt(3) / 2, 15);
    expect(right[1]).toBeCloseTo(-0.5, 15);
    expect(left[1]).toBeCloseTo(0.5, 15);
  });
});

describe('fanHolds', () => {
  it('holds its edges and what is between them, however long', () => {
    const fan = { right: [1, 0], left: [0, 1] } as const;
    for (const direction of [
      [1, 0],
      [0, 1],
      [300, 200],
      [1e-9, 1e-9],
    ] as const) {
      expect(fanHolds(fan, direction)).toBe(true);
    }
  });

  it('holds neither what is outside, nor behind, nor nothing', () => {
    const fan = { right: [1, 0], left: [0, 1] } as const;
    for (const direction of [
      [1, -0.1],
      [-0.1, 1],
      [-1, -1],
      [-1, 0],
      [0, 0],
    ] as const) {
      expect(fanHolds(fan, direction)).toBe(false);
    }
  });

  it('does not take one direction for its opposite where it has no width', () => {
    const fan = { right: [1, 0], left: [1, 0] } as const;
    expect(fanHolds(fan, [5, 0])).toBe(true);
    expect(fanHolds(fan, [-5, 0])).toBe(false);
  });

  it('agrees with angles', () => {
    holds(fc.tuple(fans, numbers(-Math.PI, Math.PI)), ([{ middle, half }, angle]) => {
      const turn = turnBetween(middle, angle);
      fc.pre(Math.abs(turn - half) > 1e-9);
      expect(fanHolds(fanAround(towards(middle), Math.sin(half)), towards(angle))).toBe(
        turn < half,
      );
    });
  });
});

describe('commonFan', () => {
  it('of two that overlap is the overlap', () => {
    const [a, b] = [
      { right: [1, 0], left: [0, 1] },
      { right: [1, 1], left: [-1, 1] },
    ] as const;
    expect(commonFan(a, b)).toEqual({ right: [1, 1], left: [0, 1] });
    expect(commonFan(b, a)).toEqual({ right: [1, 1], left: [0, 1] });
  });

  it('of one inside the other is the inner one', () => {
    const [outer, inner] = [
      { right: [1, -1], left: [1, 1] },
      { right: [5, -1], left: [5, 1] },
    ] as const;
    expect(commonFan(outer, inner)).toEqual(inner);
    expect(commonFan(inner, outer)).toEqual(inner);
  });

  it('of two apart, or opposite, is none', () => {
    const fan = { right: [1, 0], left: [2, 1] } as const;
    expect(commonFan(fan, { right: [1, 1], left: [0, 1] })).toBeUndefined();
    expect(commonFan(fan, { right: [-1, 0], left: [-2, -1] })).toBeUndefined();
  });

  it('holds what both hold and nothing else', () => {
    holds(fc.tuple(fans, fans, numbers(-Math.PI, Math.PI)), ([a, b, angle]) => {
      const [one, other] = [a, b].map(({ middle, half }) =>
        fanAround(towards(middle), Math.sin(half)),
      );
      if (one === undefined || other === undefined) throw new Error('two fans');
      const common = commonFan(one, other);
      const direction = towards(angle);
      const wanted = fanHolds(one, direction) && fanHolds(other, direction);
      expect(common !== undefined && fanHolds(common, direction)).toBe(wanted);
    });
  });
});
