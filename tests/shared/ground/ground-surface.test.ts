import { describe, expect, test } from 'vitest';
import { fieldAtPoints } from '../../../shared/ground/field-at-points.ts';
import { groundSurface, SURFACE_SQUARE } from '../../../shared/ground/ground-surface.ts';
import { FIELD, FIELD_SIZE } from '../../../shared/ground/kernel.ts';
import { levelField, type GroundState } from '../../../shared/ground/level-field.ts';
import { lossFactorsAt } from '../../../shared/ground/loss-factors-at.ts';
import { placeOf } from '../../../shared/ground/place.ts';
import { siteOf } from '../../../shared/ground/site.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { aDrive, aModel } from '../../support/builders.ts';
import { twinBores } from '../../support/twin-bores.ts';

const COMPLETE: GroundState = { position: 2, faces: [] };
/** As far off from every drive as settlement of 1e-9 m is. */
const FAR = 1e-8;

/** Points all over the twin bores, on borders of squares among them. */
const POINTS = Array.from({ length: 400 }, (_, k): PlanPoint => {
  const [e, n] = [-80 + 500 * ((k * 0.618034) % 1), -80 + 500 * ((k * 0.7548777) % 1)];
  return k % 7 === 0 ? [Math.round(e / SURFACE_SQUARE) * SURFACE_SQUARE, n] : [e, n];
});

/** The same by one field for all points with nothing left out. */
function withoutCulling(
  model: ReturnType<typeof aModel>,
  state: GroundState,
  factors: readonly number[],
): Float64Array {
  const place = placeOf([{ start: [-2000, -2000], end: [-2000, -1999] }], 0, 0);
  const field = levelField(model, siteOf(model, place, false), state);
  return fieldAtPoints(field, Float64Array.from(POINTS.flat()), factors);
}

describe('the surface of the ground', () => {
  test.each([
    ['complete', COMPLETE],
    ['at a low K', { position: 0, faces: [] }],
    ['at a high K, with faces', { position: 4, faces: [250, 100] }],
  ] as const)('moves as the sum of all pieces does: %s', (_, state) => {
    const drives = twinBores(-0.02, { troughWidth: { low: 0.4, central: 0.5, high: 0.6 } });
    const [one, two] = drives;
    if (one === undefined || two === undefined) throw new Error('two bores');
    const model = aModel([one, { ...two, volumeLoss: { low: 0.01, central: 0.02, high: 0.05 } }]);
    const factors = lossFactorsAt(model, 'high');
    expect(factors).toHaveLength(2);
    const surface = groundSurface(model, 0, state, factors);
    const wanted = withoutCulling(model, state, factors);
    let largest = 0;
    for (const [k, point] of POINTS.entries()) {
      const values = [...(surface.at(point) ?? [])];
      expect(values).toHaveLength(FIELD_SIZE);
      for (const [n, value] of values.entries()) {
        expect(Math.abs(value - (wanted[k * FIELD_SIZE + n] ?? NaN))).toBeLessThan(FAR);
      }
      largest = Math.max(largest, values[FIELD.settlement] ?? 0);
    }
    expect(largest).toBeGreaterThan(0.01);
  });

  test('is still where nothing reaches', () => {
    const surface = groundSurface(aModel(), 0, COMPLETE, [1]);
    expect([...(surface.at([0, 3000]) ?? [])]).toEqual(new Array(FIELD_SIZE).fill(0));
    expect(surface.widthAt([0, 3000])).toBe(Infinity);
    expect(surface.widthAt([0, 10])).toBe(10);
  });

  test('lies at a level of its own', () => {
    const surface = groundSurface(aModel(), 4, COMPLETE, [1]);
    expect(surface.widthAt([0, 0])).toBe(12);
    expect(surface.parts).toEqual([{ plan: { start: [-500, 0], end: [500, 0] }, width: 12 }]);
  });

  test('is undefined where a drive comes out of the ground, and goes on elsewhere', () => {
    const rising = aDrive({ axis: [[-500, 0, -20], [0, 0, -20], [200, 0, 2]] }); // prettier-ignore
    const surface = groundSurface(aModel([rising]), 0, COMPLETE, [1]);
    expect(surface.at([190, 5])).toBeUndefined();
    expect(surface.widthAt([190, 5])).toBeUndefined();
    // V_s/(√(2π)·i) with i 10 m
    expect((surface.at([-250, 0])?.[FIELD.settlement] ?? NaN) * 1000).toBeCloseTo(16.9197, 3);
  });

  test('tells every part with its largest trough width at ground level', () => {
    const model = aModel([aDrive({ axis: [[0, 0, -20], [100, 0, -22]] })]); // prettier-ignore
    const { parts } = groundSurface(model, 0, COMPLETE, [1]);
    expect(parts.length).toBeGreaterThan(3);
    expect(parts.at(-1)?.width).toBe(11);
    expect(parts.at(-1)?.plan.end).toEqual([100, 0]);
    const state = { ...COMPLETE, only: () => false };
    expect(groundSurface(model, 0, state, [1]).parts).toEqual([]);
  });
});
