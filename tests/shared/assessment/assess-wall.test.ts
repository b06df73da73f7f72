import { describe, expect, it } from 'vitest';
import { assessWall, type WallResult } from '../../../shared/assessment/assess-wall.ts';
import type { AssessmentRules } from '../../../shared/assessment/rules.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel, aWall, someRules } from '../../support/builders.ts';
import { notFinite } from '../../support/not-finite.ts';

/** A wall beside the drive of `aDrive`: i is 10 m and S is 1 mm at 23.784 m. */
function between(from: PlanPoint, to: PlanPoint, rules: Partial<AssessmentRules> = {}): WallResult {
  return assessWall(aModel(), aWall({ from, to }), someRules(rules), []);
}

const WIDTHS = { cutOff: { kind: 'widths', widths: 2.5 } } as const;

describe('assessWall: the known wall, to the digits printed', () => {
  const result = between([0, 2], [0, 28]);
  const [sagging, hogging] = result.zones;

  it('a hogging zone from 10 to 23.784 m', () => {
    expect(hogging?.mode).toBe('hogging');
    expect(2 + (hogging?.start ?? NaN)).toBeCloseTo(10, 3);
    expect(2 + (hogging?.end ?? NaN)).toBeCloseTo(23.784, 3);
    expect((hogging?.deflectionRatio ?? NaN) * 100).toBeCloseTo(0.01139, 5);
    expect((hogging?.horizontalStrain ?? NaN) * 100).toBeCloseTo(0.0286, 5);
    expect((hogging?.strain ?? NaN) * 100).toBeCloseTo(0.03788, 5);
  });

  it('a sagging zone from 2 to 10 m', () => {
    expect(sagging?.mode).toBe('sagging');
    expect((sagging?.deflectionRatio ?? NaN) * 100).toBeCloseTo(0.00908, 5);
    expect((sagging?.horizontalStrain ?? NaN) * 100).toBeCloseTo(-0.04341, 5);
    expect((sagging?.strain ?? NaN) * 100).toBeCloseTo(0.01418, 5);
  });

  it('the hogging zone governs; negligible', () => {
    expect(result.governingZone).toBe(1);
    expect(result.strain).toBe(hogging?.strain);
    expect(result.category).toBe(0);
    expect(result.warnings).toEqual([]);
  });

  it('both horizontal strains are there, whichever counts', () => {
    const peak = between([0, 2], [0, 28], { horizontalStrain: 'peak' }).zones[1];
    // the largest, 0.4463 S_max/i² · i²/f, at √3 i
    expect(hogging?.peakHorizontalStrain).toBeCloseTo((0.44626 * 0.01692) / 20, 7);
    expect(peak?.horizontalStrain).toBe(hogging?.peakHorizontalStrain);
    expect(peak?.averageHorizontalStrain).toBe(hogging?.averageHorizontalStrain);
  });
});

describe('assessWall: why a wall is not affected', () => {
  it('it settles by less than is ignored', () => {
    expect(between([0, 24], [0, 60]).warnings).toEqual(['not affected']);
  });

  it('it lies along the drive and does not bend', () => {
    const { warnings } = between([-20, 5], [20, 5]);
    expect(warnings).toEqual(['flat along the wall', 'not affected']);
  });

  it('it is shorter than 0.5 m', () => {
    expect(between([0, 14], [0, 14.49]).warnings).toEqual(['short wall', 'not affected']);
    expect(between([0, 14], [0, 14.51]).warnings).toEqual([]);
  });

  it('under 0.5 m of it settle by what counts: it is not flat', () => {
    expect(between([0, 23.5], [0, 60]).warnings).toEqual(['not affected']);
  });

  it('it lies beyond 2.5 trough widths of every drive: it is not flat', () => {
    expect(between([0, 24.9], [0, 60], WIDTHS).warnings).toEqual(['not affected']);
    expect(between([0, 24.4], [0, 60], WIDTHS).zones).toHaveLength(1);
  });

  it('no drive loses anything', () => {
    const model = aModel([aDrive({ volumeLoss: certain(0) })]);
    const result = assessWall(model, aWall(), someRules(), []);
    expect(result).toMatchObject({ strain: 0, settlementMax: 0, warnings: ['not affected'] });
  });

  it('it has no length: named, never NaN', () => {
    const result = between([0, 14], [0, 14]);
    expect(result.warnings).toEqual(['short wall', 'not affected']);
    expect(notFinite(result)).toEqual([]);
  });
});
