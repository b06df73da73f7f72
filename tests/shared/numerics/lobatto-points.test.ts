import { describe, expect, it } from 'vitest';
import { lobattoPoints } from '../../../shared/numerics/lobatto-points.ts';

describe('lobattoPoints', () => {
  it.each([2, 3, 6, 15])('%d of them are where Chebyshev polynomials turn', (count) => {
    const wanted = Array.from({ length: count }, (_, k) => -Math.cos((Math.PI * k) / (count - 1)));
    for (const [k, point] of lobattoPoints(count).entries()) {
      expect(point).toBeCloseTo(wanted[k] ?? NaN, 14);
    }
  });

  it('has both ends and the middle to the last digit', () => {
    const points = lobattoPoints(5);
    expect([points[0], points[2], points[4]]).toEqual([-1, 0, 1]);
  });
});
