import { describe, expect, test } from 'vitest';
import { limitedDesign } from '../../../shared/assessment/limited-design.ts';
import { aDesign } from '../../support/designs.ts';

const LOSS = { low: 0.005, central: 0.01, high: 0.02 };
const K = { low: 0.4, central: 0.5, high: 0.6 };
const LOWER = { low: 0.004, central: 0.006, high: 0.007 };

function stretches(design: ReturnType<typeof aDesign>) {
  return design.intervals.map(({ from, to, volumeLoss }) => [from, to, volumeLoss.high]);
}

describe('a limit of volume loss', () => {
  const limit = { volumeLoss: 0.008, from: 100, to: 300 };

  test('keeps the whole line to it within its stretch, low, central and high', () => {
    const design = aDesign({ volumeLoss: LOSS, troughWidth: K, intervals: [] });
    const limited = limitedDesign(design, limit);
    expect(limited.intervals).toEqual([
      {
        ...{ from: 100, to: 300, troughWidth: K },
        volumeLoss: { low: 0.005, central: 0.008, high: 0.008 },
      },
    ]);
    expect(limited.volumeLoss).toEqual(LOSS);
  });

  test('cuts intervals where it begins and ends, and leaves what is lower as it is', () => {
    const intervals = [
      { from: 50, to: 150, volumeLoss: LOSS, troughWidth: K },
      { from: 200, to: 250, volumeLoss: LOWER, troughWidth: K },
      { from: 280, to: 400, volumeLoss: LOSS, troughWidth: K },
    ];
    const design = aDesign({ volumeLoss: LOSS, troughWidth: K, intervals });
    expect(stretches(limitedDesign(design, limit))).toEqual([
      ...[[50, 100, 0.02], [100, 150, 0.008], [150, 200, 0.008], [200, 250, 0.007]],
      ...[[250, 280, 0.008], [280, 300, 0.008], [300, 400, 0.02]],
    ]); // prettier-ignore
  });

  test('changes nothing that it does not reach', () => {
    const design = aDesign({ volumeLoss: LOSS, troughWidth: K, intervals: [] });
    const high = limitedDesign(design, { ...limit, volumeLoss: 0.05 });
    expect(high.intervals).toMatchObject([{ volumeLoss: LOSS }]);
  });
});
