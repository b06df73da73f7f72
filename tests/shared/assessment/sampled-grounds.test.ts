import { describe, expect, it } from 'vitest';
import { sampledGrounds } from '../../../shared/assessment/sampled-grounds.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel } from '../../support/builders.ts';

const LOSS = { low: 0.005, central: 0.01, high: 0.015 };
const K = { low: 0.4, central: 0.5, high: 0.6 };
const TWIN = [
  aDrive({ volumeLoss: LOSS, troughWidth: K }),
  aDrive({
    name: 'B',
    axis: [[-500, 16, -20], [500, 16, -20]],
    volumeLoss: { ...LOSS },
    troughWidth: { ...K },
    laterFactor: 1.3,
    intervals: [{ from: 400, to: 600, volumeLoss: { ...LOSS, high: 0.03 } }],
  }),
]; // prettier-ignore

describe('sampledGrounds', () => {
  it('puts all lengths with the same ranges together, whichever drive they are of', () => {
    expect(sampledGrounds(aModel(TWIN))).toEqual([
      { number: 1, volumeLoss: LOSS, troughWidth: K, lossInput: 1, widthInput: 2 },
      {
        number: 2,
        volumeLoss: { ...LOSS, high: 0.03 },
        troughWidth: K,
        lossInput: 3,
        widthInput: 4,
      },
    ]);
  });

  it('draws no K where the rule has none, and tells grounds by volume loss alone', () => {
    const drives = [aDrive({ troughWidth: K }), aDrive({ name: 'B', troughWidth: certain(0.5) })];
    const grounds = sampledGrounds(aModel(drives, { depth: { kind: 'oreilly-new-clay' } }));
    expect(grounds.map(({ troughWidth }) => troughWidth)).toEqual([certain(0.5)]);
  });

  it('draws the K of layers once for all drives', () => {
    const layers = [
      { baseLevel: -8, troughWidth: { low: 0.3, central: 0.4, high: 0.5 } },
      { baseLevel: -60, troughWidth: { low: 0.5, central: 0.6, high: 0.7 } },
    ];
    const grounds = sampledGrounds(aModel(TWIN, { depth: { kind: 'layered', layers } }));
    expect(grounds.map(({ widthInput }) => widthInput)).toEqual([2, 2]);
    expect(grounds.map(({ lossInput }) => lossInput)).toEqual([1, 3]);
    expect(grounds[0]?.troughWidth.central).toBeCloseTo(0.5, 15);
  });

  it('has none without drives', () => {
    expect(sampledGrounds(aModel([]))).toEqual([]);
  });
});
