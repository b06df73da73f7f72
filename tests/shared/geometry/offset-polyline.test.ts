import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import { offsetPolyline } from '../../../shared/geometry/offset-polyline.ts';
import type { PlanPoint, SpacePoint } from '../../../shared/geometry/point.ts';
import { polylineParts } from '../../../shared/geometry/polyline-parts.ts';
import { axes } from '../../support/drawn-geometry.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { FAR_FROM_ORIGIN, motions, moveSpacePoint } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const bend: SpacePoint[] = [
  [0, 0, -20],
  [10, 0, -15],
  [10, 20, -10],
];

describe('offsetPolyline', () => {
  it('to the left of a left turn is shorter, its levels kept', () => {
    expect(offsetPolyline(bend, 2)).toEqual([
      [0, 2, -20],
      [8, 2, -15],
      [8, 20, -10],
    ]);
  });

  it('to the right of a left turn is longer', () => {
    expect(offsetPolyline(bend, -2)).toEqual([
      [0, -2, -20],
      [12, -2, -15],
      [12, 20, -10],
    ]);
  });

  it('of a straight line is beside it', () => {
    expect(offsetPolyline([[0, 0, 1], [4, 3, 2]], 5)).toEqual([[-3, 4, 1], [1, 7, 2]]); // prettier-ignore
  });

  it('of nothing is the line itself', () => {
    expect(offsetPolyline(bend, 0)).toEqual(bend);
  });

  it('names the vertex after a part that the offset uses up', () => {
    expect(methodErrorOf(() => offsetPolyline(bend, 10))).toEqual({
      code: 'outside-range',
      field: '[1]',
    });
    expect(offsetPolyline(bend, 9.99)).toHaveLength(3);
  });

  it('names the vertex after a part between two turns that would run backwards', () => {
    const step: SpacePoint[] = [
      [0, 0, 0],
      [50, 0, 0],
      [50, 4, 0],
      [0, 4, 0],
    ];
    expect(methodErrorOf(() => offsetPolyline(step, 2.5))).toEqual({
      code: 'outside-range',
      field: '[2]',
    });
    expect(offsetPolyline(step, -2.5)).toHaveLength(4);
  });

  it('names the vertex where a line turns back on itself', () => {
    const back: SpacePoint[] = [
      [0, 0, 0],
      [10, 0, 0],
      [5, 0, 0],
    ];
    expect(methodErrorOf(() => offsetPolyline(back, 1))).toEqual({
      code: 'outside-range',
      field: '[1]',
    });
  });

  it('refuses a single point and a repeated one', () => {
    expect(methodErrorOf(() => offsetPolyline([[0, 0, 0]], 1)).code).toBe('outside-range');
    expect(methodErrorOf(() => offsetPolyline([[0, 0, 0], [0, 0, 1]], 1))).toEqual({
      code: 'zero-length',
      field: '[1]',
    }); // prettier-ignore
  });

  it('runs parallel, part by part, at its offset on the right side', () => {
    holds(fc.tuple(axes, numbers(-3, 3)), ([axis, offset]) => {
      const [parts, moved] = [polylineParts(axis), polylineParts(offsetPolyline(axis, offset))];
      expect(moved).toHaveLength(parts.length);
      for (const [k, { start, direction }] of parts.entries()) {
        const beside = moved[k];
        if (beside === undefined) throw new Error('as many parts');
        // parts are 0.9 m at least, ends are off by 1e-13
        expect(beside.direction[0]).toBeCloseTo(direction[0], 11);
        expect(beside.direction[1]).toBeCloseTo(direction[1], 11);
        const [dx, dy] = [beside.start[0] - start[0], beside.start[1] - start[1]];
        expect(direction[0] * dy - direction[1] * dx).toBeCloseTo(offset, 11);
      }
    });
  });

  it('is undone by the opposite offset', () => {
    holds(fc.tuple(axes, numbers(-3, 3)), ([axis, offset]) => {
      const back = offsetPolyline(offsetPolyline(axis, offset), -offset);
      for (const [k, [x, y, level]] of back.entries()) {
        const [wantedX, wantedY, wantedLevel] = axis[k] ?? [NaN, NaN, NaN];
        expect(x).toBeCloseTo(wantedX, 10);
        expect(y).toBeCloseTo(wantedY, 10);
        expect(level).toBe(wantedLevel);
      }
    });
  });

  it('read backwards is at the opposite offset', () => {
    holds(fc.tuple(axes, numbers(-3, 3)), ([axis, offset]) => {
      const there = offsetPolyline(axis, offset);
      const back = offsetPolyline([...axis].reverse(), -offset).reverse();
      for (const [k, [x, y]] of back.entries()) {
        expect(x).toBeCloseTo(there[k]?.[0] ?? NaN, 10);
        expect(y).toBeCloseTo(there[k]?.[1] ?? NaN, 10);
      }
    });
  });

  it('moves with the axis', () => {
    holds(fc.tuple(axes, numbers(-3, 3), motions), ([axis, offset, motion]) => {
      const there = offsetPolyline(
        axis.map((vertex) => moveSpacePoint(motion, vertex)),
        offset,
      );
      for (const [k, vertex] of offsetPolyline(axis, offset).entries()) {
        const [x, y] = moveSpacePoint(motion, vertex);
        const point: PlanPoint = [there[k]?.[0] ?? NaN, there[k]?.[1] ?? NaN];
        const off = nearestOnSegment(point, { start: [x, y], end: [x, y] }).distance;
        // directions of 5 m parts are off by 4e-10, times 3 m of offset and a mitre of 1.2
        expect(off).toBeLessThan(2 * FAR_FROM_ORIGIN);
      }
    });
  });
});
