import { describe, expect, it } from 'vitest';
import { assessWall } from '../../shared/assessment/assess-wall.ts';
import { drawnInputs, drawnShares } from '../../shared/assessment/drawn-inputs.ts';
import { sampledGrounds } from '../../shared/assessment/sampled-grounds.ts';
import { SAMPLES, sampledRun } from '../../shared/assessment/sampled-run.ts';
import { CATEGORIES } from '../../shared/damage/categories.ts';
import { certain, type Range } from '../../shared/numerics/range.ts';
import { aDrive, aModel, aWall, someRules } from '../support/builders.ts';

const LOSS = { low: 0.005, central: 0.02, high: 0.06 };
const K = { low: 0.35, central: 0.5, high: 0.6 };

/** The triangular distribution, its mean and its variance, as any handbook has them. */
function below(x: number, { low: a, central: c, high: b }: Range): number {
  if (x <= a) return 0;
  if (x >= b) return 1;
  return x < c
    ? ((x - a) * (x - a)) / ((b - a) * (c - a))
    : 1 - ((b - x) * (b - x)) / ((b - a) * (b - c));
}

function momentsOf({ low: a, central: c, high: b }: Range) {
  return {
    mean: (a + b + c) / 3,
    variance: (a * a + b * b + c * c - a * b - a * c - b * c) / 18,
  };
}

describe('what is drawn', () => {
  const grounds = sampledGrounds(aModel([aDrive({ volumeLoss: LOSS, troughWidth: K })]));

  it.each([
    ['volume loss', 'volumeLoss', LOSS],
    ['K', 'troughWidth', K],
  ] as const)('%s has mean and variance of its triangular distribution', (_, input, range) => {
    for (const seed of [1, 2, 3]) {
      const drawn = drawnInputs(grounds, drawnShares(grounds, SAMPLES, seed));
      const values = drawn.map((sample) => sample.grounds[0]?.[input] ?? NaN);
      const mean = values.reduce((sum, one) => sum + one, 0) / SAMPLES;
      const variance = values.reduce((sum, one) => sum + (one - mean) * (one - mean), 0) / SAMPLES;
      const wanted = momentsOf(range);
      const width = range.high - range.low;
      // one value in each part: their mean strays by no more than the parts' mean width
      expect(Math.abs(mean - wanted.mean)).toBeLessThan(width / SAMPLES);
      expect(Math.abs(variance - wanted.variance)).toBeLessThan((3 * width * width) / SAMPLES);
    }
  });

  it('E/G is uniform', () => {
    const drawn = drawnInputs(grounds, drawnShares(grounds, SAMPLES, 1));
    const shares = drawn.map(({ eOverG }) => eOverG).sort((a, b) => a - b);
    for (const [k, share] of shares.entries()) {
      expect(Math.abs(share - (k + 0.5) / SAMPLES)).toBeLessThanOrEqual(0.5 / SAMPLES);
    }
  });
});

describe('the share in each category', () => {
  // within 2.5 i nothing depends on how much it settles, so that the strain is in proportion to V_L
  const rules = someRules({ cutOff: { kind: 'widths', widths: 2.5 } });

  it.each([
    ['over the axis', aWall({ from: [0, -4], to: [0, 8] })],
    ['beside it', aWall({ from: [0, 2], to: [0, 28] })],
    ['in hogging', aWall({ from: [0, 12], to: [0, 24] })],
  ])('is that of the volume losses that reach it: a wall %s', (_, wall) => {
    const one = assessWall(aModel([aDrive({ volumeLoss: certain(0.01) })]), wall, rules, []).strain;
    const model = aModel([aDrive({ volumeLoss: LOSS })]);
    const limits = CATEGORIES.map(({ limitingStrain }) => limitingStrain);
    for (const seed of [1, 2]) {
      const { counts } = sampledRun(model, [wall], rules, [], seed);
      let samples = 0;
      for (const [category, count] of counts.entries()) {
        samples += count;
        const limit = limits[category + 1];
        const wanted = limit === undefined ? 1 : below((0.01 * limit) / one, LOSS);
        // one sample in each five-hundredth of the distribution, wherever in it
        expect(Math.abs(samples - SAMPLES * wanted)).toBeLessThanOrEqual(1);
      }
      expect(counts.filter((count) => count > 0).length).toBeGreaterThan(1);
    }
  });
});
