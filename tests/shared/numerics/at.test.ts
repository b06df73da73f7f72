import { describe, expect, it } from 'vitest';
import { at } from '../../../shared/numerics/at.ts';

describe('at', () => {
  it('is the element at an index', () => {
    const values = Float64Array.of(5, 6, 7);
    expect([at(values, 0), at(values, 1), at(values, 2)]).toEqual([5, 6, 7]);
  });
});
