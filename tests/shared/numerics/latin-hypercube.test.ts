import { describe, expect, it } from 'vitest';
import { latinHypercube } from '../../../shared/numerics/latin-hypercube.ts';
import { randomShares } from '../../../shared/numerics/random-numbers.ts';

const SHARES = latinHypercube(500, 3, randomShares(1));

describe('latinHypercube', () => {
  it('has one share of each input in each part', () => {
    for (const ofInput of SHARES) {
      const parts = [...ofInput].map((share) => Math.floor(500 * share)).sort((a, b) => a - b);
      expect(parts).toEqual(Array.from({ length: 500 }, (_, k) => k));
    }
  });

  it('takes the inputs in orders that have nothing to do with each other', () => {
    const [a = new Float64Array(), b = new Float64Array()] = SHARES;
    const covariance =
      a.reduce((sum, one, k) => sum + (one - 0.5) * ((b[k] ?? NaN) - 0.5), 0) / 500;
    // a correlation of 500 pairs by lot is 0 give or take 1/√500; four times that
    expect(Math.abs(12 * covariance)).toBeLessThan(4 / Math.sqrt(500));
  });

  it('falls anywhere in a part, not in its middle', () => {
    const within = SHARES.flatMap((ofInput) => [...ofInput].map((share) => (500 * share) % 1));
    expect(Math.min(...within)).toBeLessThan(0.02);
    expect(Math.max(...within)).toBeGreaterThan(0.98);
  });
});
