import { describe, expect, it } from 'vitest';
import { lagrangeWeights } from '../../../shared/numerics/lagrange-weights.ts';

const PLACES = [0, 1, 3, 4];

function through(f: (x: number) => number, x: number): number {
  return lagrangeWeights(PLACES, x).reduce((sum, w, k) => sum + w * f(PLACES[k] ?? NaN), 0);
}

describe('lagrangeWeights', () => {
  it('repeat a polynomial that the places determine', () => {
    const cubic = (x: number) => 2 - x + 3 * x * x - 0.5 * x * x * x;
    for (const x of [-1, 0.3, 2, 3.9]) expect(through(cubic, x)).toBeCloseTo(cubic(x), 11);
  });

  it('take the value itself at a place', () => {
    expect(lagrangeWeights(PLACES, 3).map((weight) => weight + 0)).toEqual([0, 0, 1, 0]);
  });

  it('have one place stand for all', () => {
    expect(lagrangeWeights([2], 7)).toEqual([1]);
  });
});
