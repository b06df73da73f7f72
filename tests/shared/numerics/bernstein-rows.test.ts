import { describe, expect, it } from 'vitest';
import { MethodError } from '../../../shared/method-error.ts';
import { bernsteinRows } from '../../../shared/numerics/bernstein-rows.ts';

describe('bernsteinRows', () => {
  it('of degree 0 and 1', () => {
    expect([...bernsteinRows(0)]).toEqual([1]);
    expect([...bernsteinRows(1)]).toEqual([1, 0, 1, 1]);
  });

  it('of degree 2, by hand: b₁ = c₀ + c₁/2', () => {
    expect([...bernsteinRows(2)]).toEqual([1, 0, 0, 1, 0.5, 0, 1, 1, 1]);
  });

  it('of degree 3, by hand: b₂ = c₀ + 2c₁/3 + c₂/3', () => {
    const wanted = [1, 0, 0, 0, 1, 1 / 3, 0, 0, 1, 2 / 3, 1 / 3, 0, 1, 1, 1, 1];
    for (const [k, value] of [...bernsteinRows(3)].entries()) {
      expect(value).toBeCloseTo(wanted[k] ?? NaN, 15);
    }
  });

  it.each([1, 2, 3, 4, 5])('of degree %d end in the sum of all coefficients', (degree) => {
    const lastRow = [...bernsteinRows(degree)].slice(-degree - 1);
    for (const weight of lastRow) expect(weight).toBeCloseTo(1, 14);
  });

  it.each([-1, 6, 1.5])('refuse degree %d', (degree) => {
    expect(() => bernsteinRows(degree)).toThrow(MethodError);
  });
});
