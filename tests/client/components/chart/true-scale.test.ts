import { describe, expect, it } from 'vitest';
import { runsOf } from '../../../../src/components/chart/runs-of.ts';
import { exaggeration, trueScale } from '../../../../src/components/chart/true-scale.ts';

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

describe('the runs of what is there', () => {
  it('are parted by what is not', () => {
    expect(runsOf([null, 1, 2, null, null, 3])).toEqual([[1, 2], [3]]);
    expect(runsOf([null])).toEqual([]);
  });
});
