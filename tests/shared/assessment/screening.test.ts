import { describe, expect, test } from 'vitest';
import { ALL_COMPLETE, type Moment } from '../../../shared/assessment/moment.ts';
import {
  DEFAULT_SCREENING_LIMITS,
  screenFootprint,
  type Footprint,
} from '../../../shared/assessment/screening.ts';
import { volumePerMetre } from '../../../shared/ground/volume-loss.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { aDrive, aModel, someRules } from '../../support/builders.ts';

const RULES = someRules();
/** The trough of the default drive: i = 10 m. */
const DEEPEST = volumePerMetre(0.015, 6) / (Math.sqrt(2 * Math.PI) * 10);

function square(x: number, y: number, side: number): PlanPoint[] {
  return [
    [x, y],
    [x + side, y],
    [x + side, y + side],
    [x, y + side],
  ];
}

function screen(
  rings: readonly (readonly PlanPoint[])[],
  model = aModel(),
  more: Partial<Footprint> = {},
) {
  const footprint = { rings, groundLevel: 0, foundingLevel: 0, ...more };
  return screenFootprint(model, footprint, RULES, DEFAULT_SCREENING_LIMITS, [ALL_COMPLETE]);
}

describe('screening of a footprint', () => {
  test('finds the drive that passes beneath it between all its corners', () => {
    const { settlementMax } = screen([square(-30, -31.7, 60)]);
    // The lowest point of a trough is flat: a point within i/8 of the axis is right to 1 %.
    expect(settlementMax / DEEPEST).toBeGreaterThan(0.999);
    expect(settlementMax / DEEPEST).toBeLessThanOrEqual(1 + 1e-9);
  });

  test('finds the steepest slope, which stands at i', () => {
    const { slopeMax } = screen([square(-2, 0, 20)]);
    // On a grid of i/4 the nearest point lies within i/8 of the inflexion: 1 % of the slope.
    expect(slopeMax).toBeGreaterThan(0.99 * 0.6065 * (DEEPEST / 10));
    expect(slopeMax).toBeLessThanOrEqual(0.60654 * (DEEPEST / 10));
  });

  test('takes the high end of the bracket', () => {
    const range = { low: 0.005, central: 0.015, high: 0.03 };
    const { settlementMax } = screen([square(-5, -5, 10)], aModel([aDrive({ volumeLoss: range })]));
    expect(settlementMax).toBeCloseTo(2 * DEEPEST, 9);
  });

  test('takes every position of K: a low one is deeper, a high one reaches farther', () => {
    const wide = aModel([aDrive({ troughWidth: { low: 0.4, central: 0.5, high: 0.6 } })]);
    const at = (y: number, model = aModel()) => screen([square(-2, y, 4)], model).settlementMax;
    expect(at(-2, wide)).toBeCloseTo(DEEPEST * (0.5 / 0.4), 9);
    expect(at(26, wide)).toBeGreaterThan(at(26));
  });

  test('passes out only under both limits', () => {
    expect(screen([square(-2, 24, 4)]).passes).toBe(true);
    expect(screen([square(-2, -2, 4)]).passes).toBe(false);
  });

  test('a limit that is just reached does not pass', () => {
    const limits = { settlement: screen([square(-2, 24, 4)]).settlementMax, slope: 1 };
    const footprint = { rings: [square(-2, 24, 4)], groundLevel: 0, foundingLevel: 0 };
    const { passes } = screenFootprint(aModel(), footprint, RULES, limits, [ALL_COMPLETE]);
    expect(passes).toBe(false);
  });

  test('a building far away settles by nothing and passes', () => {
    const result = screen([square(0, 500, 10)]);
    expect(result).toMatchObject({ settlementMax: 0, slopeMax: 0, passes: true, warnings: [] });
  });

  test('the worst moment counts: a face that has not arrived moves less than the complete drive', () => {
    const footprint = { rings: [square(-2, -2, 4)], groundLevel: 0, foundingLevel: 0 };
    const before = { name: 'before', faces: [400] };
    const screened = (moments: readonly Moment[]) =>
      screenFootprint(aModel(), footprint, RULES, DEFAULT_SCREENING_LIMITS, moments).settlementMax;
    expect(screened([before])).toBeLessThan(1e-6);
    expect(screened([before, ALL_COMPLETE])).toBeCloseTo(DEEPEST, 9);
    expect(screened([ALL_COMPLETE, before])).toBe(screened([before, ALL_COMPLETE]));
  });

  test('drives out of proportion are tried at all three volume losses', () => {
    const model = aModel([
      aDrive({ volumeLoss: { low: 0.01, central: 0.015, high: 0.02 } }),
      aDrive({ name: 'B', volumeLoss: { low: 0.01, central: 0.01, high: 0.02 } }),
    ]);
    expect(model.groups).toHaveLength(2);
    expect(screen([square(-5, -5, 10)], model).settlementMax).toBeCloseTo(
      (DEEPEST * 0.04) / 0.015,
      9,
    );
  });

  test('a courtyard is not ground under the building, its walls are', () => {
    const courtyard = square(-20, -20, 40);
    const around = screen([square(-60, -60, 120), courtyard]);
    expect(around.settlementMax).toBeCloseTo(DEEPEST, 5);
  });

  test('founding below the crown of a drive beneath is refused, by field', () => {
    expect(() => screen([square(-40, -40, 80)], aModel(), { foundingLevel: -17.5 })).toThrow(
      expect.objectContaining({ code: 'below-crown-beside-drive', field: 'foundingLevel' }),
    );
  });

  test('carries what it rests on', () => {
    const { basis } = screen([square(-2, -2, 4)]);
    expect(basis.drives).toEqual([{ name: 'A', faceShare: 0.5, laterFactor: 1 }]);
    expect(basis.rules).toEqual(RULES);
  });
});
