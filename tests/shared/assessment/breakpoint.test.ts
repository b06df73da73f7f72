import { describe, expect, test } from 'vitest';
import { assessWall } from '../../../shared/assessment/assess-wall.ts';
import { fieldsOverTroughWidth } from '../../../shared/assessment/bracket.ts';
import { breakpointOfWall } from '../../../shared/assessment/breakpoint-of-wall.ts';
import type { Wall } from '../../../shared/building/wall.ts';
import type { GroundModel } from '../../../shared/ground/ground-model.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel, aWall, someRules } from '../../support/builders.ts';

const RULES = someRules();

function breakpointOf(
  model: GroundModel,
  wall: Wall = aWall(),
  faces: (number | undefined)[] = [],
) {
  const fields = fieldsOverTroughWidth(model, wall, RULES, faces);
  return breakpointOfWall(model, fields, wall, RULES, faces);
}

describe('the breakpoint', () => {
  test('at it the wall is in category 3, a thousandth below it is not', () => {
    const found = breakpointOf(aModel());
    const category = (loss: number) =>
      assessWall(aModel([aDrive({ volumeLoss: certain(loss) })]), aWall(), RULES, []).category;
    expect(category(found?.volumeLoss ?? NaN)).toBe(3);
    expect(category((found?.volumeLoss ?? NaN) * 0.999)).toBe(2);
  });

  test('is shown as factor, volume loss and reserve over central and high', () => {
    const volumeLoss = { low: 0.01, central: 0.015, high: 0.02 };
    const found = breakpointOf(aModel([aDrive({ volumeLoss })]));
    const factor = found?.factor ?? NaN;
    expect(found?.volumeLoss).toBeCloseTo(0.015 * factor, 12);
    expect(found?.reserveOverCentral).toBeCloseTo(factor - 1, 12);
    expect(found?.reserveOverHigh).toBeCloseTo((0.015 * factor) / 0.02 - 1, 12);
  });

  test('is none where the wall does not reach category 3 up to 10 %', () => {
    expect(breakpointOf(aModel(), aWall({ from: [0, 60], to: [0, 70] }))).toBeUndefined();
    expect(breakpointOf(aModel(), aWall({ from: [0, 400], to: [0, 410] }))).toBeUndefined();
  });

  test('is none without volume loss or without drives', () => {
    expect(breakpointOf(aModel([aDrive({ volumeLoss: certain(0) })]))).toBeUndefined();
    expect(breakpointOf(aModel([]))).toBeUndefined();
  });

  test('the smallest over K governs and its K is named', () => {
    const troughWidth = { low: 0.4, central: 0.5, high: 0.6 };
    const found = breakpointOf(aModel([aDrive({ troughWidth })]));
    const alone = [0.4, 0.5, 0.6].map(
      (k) => breakpointOf(aModel([aDrive({ troughWidth: certain(k) })]))?.factor ?? Infinity,
    );
    // Both are found to a millionth of the factor.
    expect(Math.abs((found?.factor ?? NaN) / Math.min(...alone) - 1)).toBeLessThan(3e-6);
    expect(found?.position).toBe([0, 2, 4][alone.indexOf(Math.min(...alone))]);
  });

  test('the smallest over E/G governs', () => {
    const eOverG = { low: 0.5, central: 2.6, high: 12.5 };
    const found = breakpointOf(aModel(), aWall({ eOverG }));
    const alone = [0.5, 2.6, 12.5].map(
      (ratio) => breakpointOf(aModel(), aWall({ eOverG: certain(ratio) }))?.factor ?? Infinity,
    );
    expect(Math.abs((found?.factor ?? NaN) / Math.min(...alone) - 1)).toBeLessThan(3e-6);
    expect(found?.eOverG).toBe([0.5, 2.6, 12.5][alone.indexOf(Math.min(...alone))]);
  });

  test('names the drive that gives most of the settlement, with its own volume loss there', () => {
    const intervals = [{ from: 400, to: 600, volumeLoss: certain(0.02) }];
    const model = aModel([
      aDrive({ name: 'far', axis: [[-500, -60, -20], [500, -60, -20]] }),
      aDrive({ name: 'near', intervals }),
    ]); // prettier-ignore
    const found = breakpointOf(model);
    expect(found?.drive).toBe(1);
    expect(found?.volumeLoss).toBeCloseTo(0.02 * (found?.factor ?? NaN), 12);
  });
});
