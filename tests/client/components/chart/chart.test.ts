import { describe, expect, it } from 'vitest';
import { pathBetween, pathOf } from '../../../../src/components/chart/path-of.ts';

describe('paths', () => {
  it('run through their places, or there and back', () => {
    expect(pathOf([[0, 1], [2.04, 3]])).toBe('M0.0 1.0L2.0 3.0'); // prettier-ignore
    expect(pathOf([])).toBe('');
    expect(pathBetween([[0, 0], [1, 0]], [[0, 1], [1, 1]])).toBe('M0.0 0.0L1.0 0.0L1.0 1.0L0.0 1.0Z'); // prettier-ignore
    expect(pathBetween([], [])).toBe('');
  });
});
