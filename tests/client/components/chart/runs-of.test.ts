import { describe, expect, it } from 'vitest';
import { runsOf } from '../../../../src/components/chart/runs-of.ts';

describe('the runs of what is there', () => {
  it('are parted by what is not', () => {
    expect(runsOf([null, 1, 2, null, null, 3])).toEqual([[1, 2], [3]]);
    expect(runsOf([null])).toEqual([]);
  });
});
