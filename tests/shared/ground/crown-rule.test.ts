import { describe, expect, it } from 'vitest';
import type { SpacePoint } from '../../../shared/geometry/point.ts';
import type { Drive } from '../../../shared/ground/drive.ts';
import { levelField } from '../../../shared/ground/level-field.ts';
import { placeOf } from '../../../shared/ground/place.ts';
import { siteOf } from '../../../shared/ground/site.ts';
import { certain } from '../../../shared/numerics/range.ts';
import type { Warning } from '../../../shared/warnings.ts';
import { aDrive, aModel } from '../../support/builders.ts';
import { cutAxis } from '../../support/cut-axis.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';

const LEFT_OUT: Warning = 'drive above the founding level left out';
const NEAR_CROWN: Warning = 'founded within one diameter of the crown';
const COVER: Warning = 'cover under one diameter';

/** The field of drives at a wall along them, `off` metres away, ground at 0 m. */
function fieldAt(off: number, foundingLevel: number, drives: readonly Drive[] = [aDrive()]) {
  const place = placeOf([{ start: [0, off], end: [10, off] }], 0, foundingLevel);
  const model = aModel(drives);
  return levelField(model, siteOf(model, place, false), { position: 2, faces: [] });
}

function packed(off: number, foundingLevel: number, drives?: readonly Drive[]): number {
  return fieldAt(off, foundingLevel, drives).packs.reduce((sum, { count }) => sum + count, 0);
}

// axis 20 m deep, D 6 m, K 0.5: crown at −17 m, i at ground level 10 m, beside within 25 + 3 m

describe('the crown rule of the method', () => {
  it.each([-17, -17.5, -20, -30])('refuses a founding level of %d m beside the drive', (level) => {
    expect(methodErrorOf(() => fieldAt(10, level))).toEqual({
      code: 'below-crown-beside-drive',
      field: 'foundingLevel',
    });
  });

  it('says which drive, where and how far off', () => {
    expect(() => fieldAt(10, -18)).toThrow(/drive "A" at chainage 0 m, 10\.0 m off in plan/);
  });

  it('takes a founding level just over the crown, with a warning', () => {
    const { warnings } = fieldAt(10, -16.99);
    expect(warnings).toEqual([NEAR_CROWN]);
  });

  it('beside ends at 2.5 i + D/2: refused before it, left out with a warning from it on', () => {
    expect(methodErrorOf(() => fieldAt(27.999, -18)).code).toBe('below-crown-beside-drive');
    expect(fieldAt(28.001, -18).warnings).toEqual([LEFT_OUT]);
    expect(packed(28.001, -18)).toBe(0);
    expect(packed(300, -18)).toBe(0);
  });

  it('refuses nothing for a length not yet driven, in one piece or in many', () => {
    const place = placeOf([{ start: [0, 10], end: [10, 10] }], 0, -18);
    for (const parts of [1, 100]) {
      const model = aModel([aDrive({ axis: cutAxis(aDrive().axis, parts) })]);
      const field = levelField(model, siteOf(model, place, false), { position: 2, faces: [100] });
      expect(field.packs[0]?.count).toBe(0);
    }
  });

  it('a line that rises to a portal far off does not spoil a run', () => {
    const axis: SpacePoint[] = [
      [-100, 0, -20],
      [100, 0, -20],
      [700, 0, 4],
    ];
    const { warnings, packs } = fieldAt(5, -2, [aDrive({ axis })]);
    expect(warnings).toEqual([LEFT_OUT]);
    expect(packs[0]?.count).toBeGreaterThan(10);
  });

  it('refuses a rule that gives no width beside, and leaves it out farther off', () => {
    // 0.2·20 − 0.325·12.4 is −0.03 m; beside is 2.5·4 + 3 m
    const drives = [aDrive({ troughWidth: certain(0.2) })];
    expect(methodErrorOf(() => fieldAt(12.9, -12.4, drives))).toEqual({
      code: 'trough-width-not-positive',
      field: 'foundingLevel',
    });
    expect(fieldAt(13.1, -12.4, drives).warnings).toContain(LEFT_OUT);
    expect(packed(12.9, -12.2, drives)).toBe(1);
  });
});

describe('warnings of a drive beside a wall', () => {
  it('within one diameter of the crown', () => {
    expect(fieldAt(10, -11.001).warnings).toEqual([NEAR_CROWN]);
    expect(fieldAt(10, -11).warnings).toEqual([]);
  });

  it('with less than one diameter of cover', () => {
    const shallow = (axis: number) => [
      aDrive({
        axis: [
          [-500, 0, axis],
          [500, 0, axis],
        ],
      }),
    ];
    expect(fieldAt(5, 0, shallow(-8.999)).warnings).toEqual([NEAR_CROWN, COVER]);
    expect(fieldAt(5, 0, shallow(-9)).warnings).toEqual([]);
    // 2.5·4.5 + 3 m
    expect(fieldAt(14.3, 0, shallow(-8.999)).warnings).toEqual([]);
  });

  it('are not for a drive farther off', () => {
    expect(fieldAt(28.001, -11.001).warnings).toEqual([]);
  });

  it('the crown rule asks for the width at the highest point of each piece', () => {
    const axis: SpacePoint[] = [
      [0, 0, -30],
      [10, 0, -29.5],
    ];
    const drives = [aDrive({ axis })];
    // the crown rises from −27 to −26.5 m
    expect(methodErrorOf(() => fieldAt(0, -26.6, drives)).code).toBe('below-crown-beside-drive');
    expect(packed(0, -26.4, drives)).toBeGreaterThan(0);
  });
});

describe('levelField', () => {
  it('refuses a founding level above the ground', () => {
    expect(methodErrorOf(() => fieldAt(10, 0.01))).toEqual({
      code: 'founding-above-ground',
      field: 'foundingLevel',
    });
  });

  it('says that a later drive was increased', () => {
    const drives = [aDrive(), aDrive({ laterFactor: 1.3 })];
    expect(fieldAt(10, 0, drives).warnings).toEqual(['later drive increased']);
  });

  it('passes on what the width and the focus warn of, once', () => {
    const drives = [aDrive({ troughWidth: certain(0.39) }), aDrive({ troughWidth: certain(0.35) })];
    expect(fieldAt(10, -1, drives).warnings).toEqual(['depth rule for clay with K below 0.4']);
  });
});
