import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { intervalIndex } from '../../../shared/numerics/interval-index.ts';
import { holds, numbers } from '../../support/property.ts';

const values = Float64Array.of(0, 1, 3, 7);

describe('intervalIndex', () => {
  it.each([
    [-5, 0],
    [0, 0],
    [0.5, 0],
    [1, 1],
    [2.9, 1],
    [3, 2],
    [7, 2],
    [100, 2],
  ])('of %d is %d', (x, expected) => {
    expect(intervalIndex(values, x)).toBe(expected);
  });

  it('is 0 where there is one interval', () => {
    expect(intervalIndex(Float64Array.of(2, 5), 4)).toBe(0);
    expect(intervalIndex(Float64Array.of(2, 5), 9)).toBe(0);
  });

  it('agrees with a search from the start', () => {
    const cases = fc.tuple(fc.array(numbers(0.01, 5), { minLength: 1 }), numbers(-2, 60));
    holds(cases, ([widths, x]) => {
      const growing = [0];
      for (const width of widths) growing.push((growing.at(-1) ?? 0) + width);
      const passed = growing.filter((value) => value <= x).length - 1;
      const wanted = Math.min(Math.max(passed, 0), growing.length - 2);
      expect(intervalIndex(Float64Array.from(growing), x)).toBe(wanted);
    });
  });
});
