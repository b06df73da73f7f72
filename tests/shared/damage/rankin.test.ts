import { describe, expect, it } from 'vitest';
import { RANKIN_CLASSES, rankinClass } from '../../../shared/damage/rankin.ts';

describe('rankinClass: rankin-1988', () => {
  it.each([
    ['negligible', 'slight', 1 / 500, 0.01],
    ['slight', 'moderate', 1 / 200, 0.05],
    ['moderate', 'high', 1 / 50, 0.075],
  ])('%s becomes %s at a slope of %d or a settlement of %d m', (lesser, worse, slope, S) => {
    const less = 1 - Number.EPSILON;
    expect(rankinClass(slope * less, S * less)).toBe(lesser);
    expect(rankinClass(slope, 0)).toBe(worse);
    expect(rankinClass(0, S)).toBe(worse);
    expect(rankinClass(slope, S)).toBe(worse);
  });

  it('is the worse of the two', () => {
    expect(rankinClass(1 / 100, 0.009)).toBe('moderate');
    expect(rankinClass(0.0001, 0.08)).toBe('high');
    expect(rankinClass(1 / 40, 0.06)).toBe('high');
    expect(rankinClass(0, 0)).toBe('negligible');
  });

  it('has its rows in order', () => {
    expect(RANKIN_CLASSES.map(({ name }) => name)).toEqual([
      'negligible',
      'slight',
      'moderate',
      'high',
    ]);
  });
});
