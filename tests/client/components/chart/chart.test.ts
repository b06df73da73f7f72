import { describe, expect, it } from 'vitest';
import { linearScale } from '../../../../src/components/chart/linear-scale.ts';
import { niceTicks } from '../../../../src/components/chart/nice-ticks.ts';
import { pathBetween, pathOf } from '../../../../src/components/chart/path-of.ts';

describe('linearScale', () => {
  it('takes the ends of the values to the ends of the drawing, and goes on beyond', () => {
    const scale = linearScale([0, 10], [100, 0]);
    expect([0, 5, 10, 12].map(scale)).toEqual([100, 50, 0, -20]);
  });

  it('puts everything at the start where the values have no span', () => {
    expect(linearScale([3, 3], [7, 9])(3)).toBe(7);
  });
});

describe('niceTicks', () => {
  it.each([
    [0, 26, 5, [0, 10, 20]],
    [0, 25, 5, [0, 5, 10, 15, 20, 25]],
    [-0.05, 0.12, 4, [-0.05, 0, 0.05, 0.1]],
    [0, 0.3, 3, [0, 0.1, 0.2, 0.3]],
    [2, 28, 5, [10, 20]],
    [1, 1, 5, []],
  ])('from %s to %s', (from, to, count, ticks) => {
    expect(niceTicks(from, to, count)).toEqual(ticks);
  });
});

describe('paths', () => {
  it('run through their places, or there and back', () => {
    expect(pathOf([[0, 1], [2.04, 3]])).toBe('M0.0 1.0L2.0 3.0'); // prettier-ignore
    expect(pathOf([])).toBe('');
    expect(pathBetween([[0, 0], [1, 0]], [[0, 1], [1, 1]])).toBe('M0.0 0.0L1.0 0.0L1.0 1.0L0.0 1.0Z'); // prettier-ignore
    expect(pathBetween([], [])).toBe('');
  });
});
