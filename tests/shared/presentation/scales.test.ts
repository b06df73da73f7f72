import { describe, expect, it } from 'vitest';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { linearScale } from '../../../shared/presentation/linear-scale.ts';
import { niceTicks } from '../../../shared/presentation/nice-ticks.ts';
import { exaggeration, RULER_SCALES, trueScale } from '../../../shared/presentation/true-scale.ts';

describe('formatCount', () => {
  it.each([
    [0, '0'],
    [2388, '2\u2009388'],
    [1234567.25, '1\u2009234\u2009567.25'],
    [-24.1, '\u221224.1'],
  ])('writes %d as people read it', (value, words) => {
    expect(formatCount(value)).toBe(words);
  });
});

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

describe('the scale of a drawing', () => {
  it.each([
    [4.6, 1000],
    [3.7, 1250],
    [3.7796, 1000],
    [0.3, 15_000],
    [37, 125],
  ])('with at most %s pixels a metre is 1 to %s', (most, denominator) => {
    const scale = trueScale(most);
    expect(scale.denominator).toBe(denominator);
    expect(scale.pixelsPerMetre).toBeLessThanOrEqual(most + 1e-4);
    // a pixel is a 96th of an inch
    expect((scale.pixelsPerMetre / 96) * 25.4 * denominator).toBeCloseTo(1000, 9);
  });
});

describe('the scale of a drawing on paper', () => {
  it.each([
    [9, 500],
    [16, 250],
    [13, 500],
  ])('with at most %s pixels a metre is 1 to %s, as rulers have it', (most, denominator) => {
    expect(trueScale(most, RULER_SCALES).denominator).toBe(denominator);
  });
});

describe('an exaggeration', () => {
  it.each([
    [299, 200],
    [300, 300],
    [999, 500],
    [1000, 1000],
    [1.9, 1],
    [0.4, 1],
    [Infinity, 1],
  ])('of at most %s is %s', (most, factor) => {
    expect(exaggeration(most)).toBe(factor);
  });
});
