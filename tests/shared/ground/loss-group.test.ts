import { describe, expect, it } from 'vitest';
import {
  groupWithFactors,
  lossFactors,
  unitVolumeLoss,
  type LossGroup,
} from '../../../shared/ground/loss-group.ts';
import { lossFactorsAt } from '../../../shared/ground/loss-factors-at.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel } from '../../support/builders.ts';

const range = { low: 0.005, central: 0.01, high: 0.02 };

describe('lossFactors', () => {
  it('are of the central loss', () => {
    expect(unitVolumeLoss(range)).toBe(0.01);
    expect(lossFactors(range)).toEqual({ low: 0.5, central: 1, high: 2 });
    expect(lossFactors(certain(0.013))).toEqual(certain(1));
  });

  it('are of the high loss where the central one is nothing', () => {
    const none = { low: 0, central: 0, high: 0.02 };
    expect(unitVolumeLoss(none)).toBe(0.02);
    expect(lossFactors(none)).toEqual({ low: 0, central: 0, high: 1 });
  });

  it('are nothing where nothing is lost', () => {
    expect(lossFactors(certain(0))).toEqual(certain(0));
  });
});

describe('groupWithFactors', () => {
  it('finds a group or adds one', () => {
    const groups: LossGroup[] = [];
    expect(groupWithFactors(groups, certain(1))).toBe(0);
    expect(groupWithFactors(groups, { low: 0.5, central: 1, high: 2 })).toBe(1);
    expect(groupWithFactors(groups, certain(1))).toBe(0);
    expect(groups).toHaveLength(2);
  });
});

describe('groups of a model', () => {
  it('drives and intervals whose losses keep one proportion are one group', () => {
    const intervals = [
      { from: 100, to: 200, volumeLoss: { low: 0.01, central: 0.02, high: 0.04 } },
    ];
    const model = aModel([aDrive({ volumeLoss: range, intervals }), aDrive({ volumeLoss: range })]);
    expect(model.groups).toHaveLength(1);
    expect(lossFactorsAt(model, 'low')).toEqual([0.5]);
    expect(lossFactorsAt(model, 'central')).toEqual([1]);
    expect(lossFactorsAt(model, 'high')).toEqual([2]);
  });

  it('another proportion is another group', () => {
    const intervals = [{ from: 100, to: 200, volumeLoss: certain(0.01) }];
    const model = aModel([aDrive({ volumeLoss: range, intervals })]);
    expect(lossFactorsAt(model, 'high')).toEqual([2, 1]);
  });
});
