import { expect, test } from 'vitest';
import { categoryCurves } from '../../../shared/assessment/category-curves.ts';
import { beamStrains } from '../../../shared/building/deep-beam.ts';
import { limitingStrain } from '../../../shared/damage/category-of-strain.ts';

const BEAM = { length: 14, height: 12, eOverG: 2.6, poisson: 0.3 };

test.each(['sagging', 'hogging'] as const)(
  'every place on a curve reaches its category through the deep beam: %s',
  (mode) => {
    const curves = categoryCurves(mode, BEAM, -0.0005, 0.004);
    expect(curves.map(({ category }) => category)).toEqual([1, 2, 3, 4]);
    for (const { category, points } of curves) {
      expect(points.length).toBeGreaterThan(2);
      for (const { horizontalStrain, deflectionRatio } of points) {
        const { strain } = beamStrains(mode, BEAM, deflectionRatio, horizontalStrain);
        expect(Math.abs(strain / limitingStrain(category) - 1)).toBeLessThan(1e-9);
      }
    }
  },
);

test('a curve runs from the left edge of the chart down to its limiting strain', () => {
  const [first] = categoryCurves('hogging', BEAM, 0, 0.002);
  expect(first?.points[0]?.horizontalStrain).toBe(0);
  expect(first?.points.at(-1)).toEqual({ horizontalStrain: 0.0005, deflectionRatio: 0 });
});

test('a curve that lies left of the chart has no points', () => {
  const [first, second] = categoryCurves('hogging', BEAM, 0.0006, 0.002);
  expect(first?.points).toEqual([]);
  expect(second?.points[0]?.horizontalStrain).toBe(0.0006);
});

test('compression closes a curve at the limit over Poisson’s ratio', () => {
  const [first] = categoryCurves('sagging', BEAM, -0.01, 0.001);
  expect(first?.points[0]?.horizontalStrain).toBeCloseTo(-0.0005 / 0.3, 12);
  const [open] = categoryCurves('sagging', { ...BEAM, poisson: 0 }, -0.01, 0.001);
  expect(open?.points[0]?.horizontalStrain).toBe(-0.01);
});
