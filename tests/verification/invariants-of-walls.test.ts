import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assessWall, type WallResult } from '../../shared/assessment/assess-wall.ts';
import { bracketOfWall, fieldsOverTroughWidth } from '../../shared/assessment/bracket.ts';
import type { Wall } from '../../shared/building/wall.ts';
import type { Drive } from '../../shared/ground/drive.ts';
import { CENTRAL, certain } from '../../shared/numerics/range.ts';
import { aDrive, aModel, aWall, someRules } from '../support/builders.ts';
import { bentAxes, drawnDrives, drawnWalls, straightAxes } from '../support/drawn-schemes.ts';
import { motions, moveSegment, moveSpacePoint } from '../support/plan-motion.ts';
import { holds, numbers } from '../support/property.ts';

const RULES = someRules();
const CASES = fc.noShrink(
  fc.record({
    drives: fc.array(drawnDrives(bentAxes), { minLength: 1, maxLength: 2 }),
    wall: drawnWalls,
    face: fc.option(numbers(60, 240), { nil: undefined }),
  }),
);

function assessed(drives: readonly Drive[], wall: Wall, face?: number): WallResult {
  return assessWall(aModel(drives), wall, RULES, [face]);
}

function loaded(drive: Drive, factor: number): Drive {
  return { ...drive, volumeLoss: certain(drive.volumeLoss.central * factor) };
}

/** The drive with a range about its V_L and K. */
function uncertain(drive: Drive): Drive {
  const [V_L, K] = [drive.volumeLoss.central, drive.troughWidth.central];
  return {
    ...drive,
    volumeLoss: { low: V_L / 2, central: V_L, high: 1.5 * V_L },
    troughWidth: { low: K - 0.1, central: K, high: K + 0.1 },
  };
}

/** Two results alike: zones to a length, figures to a share of them or of nothing felt. */
function expectAlike(got: WallResult, wanted: WallResult, length: number, share: number): void {
  expect(got.zones.map(({ mode }) => mode)).toEqual(wanted.zones.map(({ mode }) => mode));
  for (const [k, zone] of wanted.zones.entries()) {
    expect(Math.abs((got.zones[k]?.start ?? NaN) - zone.start)).toBeLessThan(length);
    expect(Math.abs((got.zones[k]?.end ?? NaN) - zone.end)).toBeLessThan(length);
  }
  for (const figure of ['strain', 'settlementMax', 'slopeMax', 'angularDistortion'] as const) {
    const off = Math.abs(got[figure] - wanted[figure]);
    expect(off, figure).toBeLessThanOrEqual(share * Math.max(wanted[figure], 1e-6));
  }
}

describe('the method: what holds for any wall', { timeout: 60_000 }, () => {
  it('the same when all is moved and turned, to where national grids are too', () => {
    holds(
      fc.noShrink(fc.tuple(CASES, motions)),
      ([{ drives, wall, face }, motion]) => {
        const moved = drives.map((drive) => ({
          ...drive,
          axis: drive.axis.map((vertex) => moveSpacePoint(motion, vertex)),
        }));
        const there = { ...wall, segment: moveSegment(motion, wall.segment) };
        // coordinates are rounded by 1e-8 m, 2e-9 of i; where curvature or settlement but grazes its
        // limit an end moves by the root of that, 5e-5 of i, and what is taken along the zone too
        const [got, wanted] = [assessed(moved, there, face), assessed(drives, wall, face)];
        expectAlike(got, wanted, 1e-3, 1e-4);
      },
      60,
    );
  });

  it('the same from either end', () => {
    holds(CASES, ({ drives, wall, face }) => {
      const { start, end } = wall.segment;
      const got = assessed(drives, { ...wall, segment: { start: end, end: start } }, face);
      const length = Math.hypot(end[0] - start[0], end[1] - start[1]);
      const turned = got.zones
        .map((zone) => ({ ...zone, start: length - zone.end, end: length - zone.start }))
        .reverse();
      // rounding of 1e-15 m in the nodes
      const wanted = assessed(drives, wall, face);
      expectAlike({ ...got, zones: turned }, wanted, 1e-7, 1e-8);
      expect(Math.abs(got.tilt + wanted.tilt)).toBeLessThan(1e-12);
    });
  });

  it('more volume loss of a straight drive never strains less a wall that it strains at all', () => {
    // at less than 0.01 % it may, by up to 35 %: as the settlement reaches 1 mm farther off, a zone
    // under compression grows longer and so is compressed less, or frees itself of its slivers
    const cases = fc.tuple(drawnDrives(straightAxes), drawnWalls, numbers(1.001, 2));
    holds(cases, ([drive, wall, factor]) => {
      const [less = NaN, more] = [1, factor].map((f) => assessed([loaded(drive, f)], wall).strain);
      if (less > 1e-4) expect(more).toBeGreaterThanOrEqual(less * (1 - 1e-12));
    });
  });

  it('a zone that appears makes the strain jump, so that no strain tells the breakpoint', () => {
    // 1 mm is reached 0.5 m along this wall, the least that is assessed, at 1.507 %
    const wall = aWall({ from: [0, 23.3], to: [0, 60] });
    const strains = [0.015, 0.01515].map(
      (V_L) => assessed([aDrive({ volumeLoss: certain(V_L) })], wall).strain,
    );
    expect(strains[0]).toBe(0);
    expect(strains[1]).toBeGreaterThan(0.0002);
  });

  it('the centre of the bracket is the wall as assessed', () => {
    holds(CASES, ({ drives, wall, face }) => {
      const model = aModel(drives.map(uncertain));
      const fields = fieldsOverTroughWidth(model, wall, RULES, [face]);
      const { strains } = bracketOfWall(model, fields, wall, RULES);
      expect(strains[0]?.[1]?.[CENTRAL]).toBe(assessWall(model, wall, RULES, [face]).strain);
    });
  });
});
