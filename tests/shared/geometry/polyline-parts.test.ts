import { describe, expect, it } from 'vitest';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import { polylineParts } from '../../../shared/geometry/polyline-parts.ts';
import { axes } from '../../support/drawn-geometry.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { holds } from '../../support/property.ts';

describe('polylineParts', () => {
  it('has length and direction in plan, whatever the levels', () => {
    const parts = polylineParts([
      [0, 0, -20],
      [3, 4, -10],
      [3, 14, 0],
    ]);
    expect(parts).toEqual([
      { start: [0, 0], end: [3, 4], length: 5, direction: [0.6, 0.8] },
      { start: [3, 4], end: [3, 14], length: 10, direction: [0, 1] },
    ]);
  });

  it('of one point or none are none', () => {
    expect(polylineParts([])).toEqual([]);
    expect(polylineParts([[1, 2]])).toEqual([]);
  });

  it('names the vertex that repeats the one before', () => {
    const refused = methodErrorOf(() =>
      polylineParts([
        [0, 0],
        [1, 0],
        [1, 0],
      ]),
    );
    expect(refused).toEqual({ code: 'zero-length', field: '[2]' });
  });

  it('refuses a part that only climbs', () => {
    const refused = methodErrorOf(() =>
      polylineParts([
        [5, 5, -20],
        [5, 5, 0],
      ]),
    );
    expect(refused).toEqual({ code: 'zero-length', field: '[1]' });
  });

  it('refuses what is not a number', () => {
    expect(methodErrorOf(() => polylineParts([[0, 0], [NaN, 1]])).code).toBe('zero-length'); // prettier-ignore
  });

  it('have directions of length one', () => {
    holds(axes, (axis) => {
      for (const { direction } of polylineParts(axis)) {
        expect(planDistance(direction, [0, 0])).toBeCloseTo(1, 14);
      }
    });
  });
});
