import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compensatedSum } from '../../../shared/numerics/compensated-sum.ts';
import { holds } from '../../support/property.ts';

/** A sum without rounding: whole numbers of units of 2⁻¹⁰. */
const units = fc.integer({ min: -(2 ** 40), max: 2 ** 40 });

describe('compensatedSum', () => {
  it('of nothing is 0', () => {
    expect(compensatedSum([])).toBe(0);
  });

  it('keeps a small term between two large ones', () => {
    expect(compensatedSum([1, 1e100, 1, -1e100])).toBe(2);
    expect(compensatedSum([1e16, 1, -1e16])).toBe(1);
  });

  it('adds a tenth ten times to one', () => {
    expect(compensatedSum(Array.from({ length: 10 }, () => 0.1))).toBe(1);
  });

  it('takes any iterable', () => {
    expect(compensatedSum(new Set([1, 2, 3]))).toBe(6);
  });

  it('is exact where the sum is', () => {
    holds(fc.array(units), (terms) => {
      const exact = terms.reduce((sum, term) => sum + BigInt(term), 0n);
      expect(compensatedSum(terms.map((term) => term / 1024))).toBe(Number(exact) / 1024 + 0);
    });
  });

  it('does not depend on the order to more than one rounding', () => {
    holds(fc.array(fc.double({ min: -1e6, max: 1e6, noNaN: true })), (terms) => {
      const size = terms.reduce((sum, term) => sum + Math.abs(term), 0);
      const backwards = compensatedSum([...terms].reverse());
      expect(Math.abs(compensatedSum(terms) - backwards)).toBeLessThanOrEqual(size * 2.3e-16);
    });
  });
});
