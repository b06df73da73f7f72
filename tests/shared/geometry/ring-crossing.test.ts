import { describe, expect, it } from 'vitest';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { ringCrossing } from '../../../shared/geometry/ring-crossing.ts';
import { regularRing } from '../../support/drawn-geometry.ts';

const SQUARE: PlanPoint[] = [[0, 0], [10, 0], [10, 10], [0, 10]]; // prettier-ignore
const BOW: PlanPoint[] = [[0, 0], [10, 10], [10, 0], [0, 10]]; // prettier-ignore
const ROUNDING = 0.001;

function moved(ring: readonly PlanPoint[], x: number, y: number): PlanPoint[] {
  return ring.map(([e, n]) => [e + x, n + y]);
}

describe.each([0, ROUNDING])('a crossing of rings by more than %s m', (tolerance) => {
  it.each<[string, PlanPoint[][]]>([
    ['nothing', []],
    ['a simple ring', [SQUARE]],
    ['rings that are closed and lie apart', [[...SQUARE, [0, 0]], moved(SQUARE, 20, 0)]],
    ['a long ring', [regularRing(5000, 100)]],
    ['rings that touch in a point', [SQUARE, moved(SQUARE, 10, 10)]],
    ['a ring that touches itself', [[[0, 0], [10, 0], [10, 10], [5, 0], [0, 10]]]],
    ['a hole in its ring', [SQUARE, [[2, 2], [2, 4], [4, 4]]]],
  ])('is not in %s', (_, rings) => {
    expect(ringCrossing(rings, tolerance)).toBeUndefined();
  }); // prettier-ignore

  it('is found in a bow tie, far from the origin too', () => {
    expect(ringCrossing([BOW], tolerance)).toEqual([5, 5]);
    const far = moved(BOW, 500_000, 6_080_000);
    expect(ringCrossing([far], tolerance)).toEqual([500_005, 6_080_005]);
  });

  it('is found between rings', () => {
    expect(ringCrossing([SQUARE, moved(SQUARE, 5, 5)], tolerance)).toBeDefined();
  });

  it('is found in a long ring that is cut', () => {
    const round = regularRing(10_000, 1000);
    const cut = [...round.slice(0, 5000), [900, 900] as const, ...round.slice(5000)];
    expect(ringCrossing([cut], tolerance)).toBeDefined();
  });
});

describe('rings that run over each other', () => {
  const neighbours = [SQUARE, moved(SQUARE, 10, 0)];
  const spike: PlanPoint[] = [[0, 0], [10, 0], [4, 0], [4, 8]]; // prettier-ignore

  it('cross where the tolerance is nought', () => {
    expect(ringCrossing(neighbours, 0)).toBeDefined();
    expect(ringCrossing([spike], 0)).toBeDefined();
  });

  it('do not cross by more than a tolerance', () => {
    expect(ringCrossing(neighbours, ROUNDING)).toBeUndefined();
    expect(ringCrossing([spike], ROUNDING)).toBeUndefined();
  });

  it('by rounding cross only where the tolerance is less', () => {
    const pushed: PlanPoint[] = [[9.9996, 2], [20, 0], [20, 10], [10, 10]]; // prettier-ignore
    expect(ringCrossing([SQUARE, pushed], ROUNDING)).toBeUndefined();
    expect(ringCrossing([SQUARE, pushed], 0.0001)).toBeDefined();
  });
});
