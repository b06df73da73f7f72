import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { at } from '../../../shared/numerics/at.ts';
import { compensatedSum } from '../../../shared/numerics/compensated-sum.ts';
import { runningSums } from '../../../shared/numerics/running-sums.ts';
import { holds, numbers } from '../../support/property.ts';

describe('runningSums', () => {
  it('starts at 0 and has one sum more than terms', () => {
    expect([...runningSums(Float64Array.of(1, 2, 3))]).toEqual([0, 1, 3, 6]);
  });

  it('of nothing is a single 0', () => {
    expect([...runningSums(new Float64Array(0))]).toEqual([0]);
  });

  it('keeps its digits over a million small terms', () => {
    const sums = runningSums(new Float64Array(1_000_000).fill(0.1));
    // plain addition would be off by 1e-6
    expect(at(sums, 1_000_000)).toBeCloseTo(100_000, 10);
  });

  it('ends at the compensated sum of the terms before', () => {
    holds(fc.array(numbers(-1e6, 1e6)), (terms) => {
      const sums = runningSums(Float64Array.from(terms));
      for (let k = 0; k <= terms.length; k++) {
        expect(at(sums, k)).toBe(compensatedSum(terms.slice(0, k)));
      }
    });
  });
});
