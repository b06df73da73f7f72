import { describe, expect, test } from 'vitest';
import { drivesOfDesign } from '../../../shared/assessment/drives-of-design.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { groundSurface, type GroundSurface } from '../../../shared/ground/ground-surface.ts';
import type { GroundModel } from '../../../shared/ground/ground-model.ts';
import { FIELD } from '../../../shared/ground/kernel.ts';
import { lossFactorsAt } from '../../../shared/ground/loss-factors-at.ts';
import {
  settlementContours,
  type SettlementContour,
} from '../../../shared/ground/settlement-contours.ts';
import { aDrive, aModel } from '../../support/builders.ts';
import { aDesign } from '../../support/designs.ts';
import { twinBores } from '../../support/twin-bores.ts';

const LEVELS = [0.001, 0.002, 0.005, 0.01, 0.02, 0.03, 0.05];

function surfaceOf(model: GroundModel, faces: number[] = []): GroundSurface {
  return groundSurface(model, 0, { position: 2, faces }, lossFactorsAt(model, 'high'));
}

function segmentsOf({ line }: SettlementContour): [PlanPoint, PlanPoint][] {
  return line.slice(1).flatMap((to, k) => {
    const from = line[k];
    return from === undefined ? [] : [[from, to]];
  });
}

/** How far off its level a contour is, in tolerances, at its vertices and five places of every segment. */
function worstOf(surface: GroundSurface, contours: readonly SettlementContour[]): number {
  let [worst, seed] = [0, 0];
  for (const contour of contours) {
    const tolerance = Math.max(0.02 * contour.level, 0.0001);
    for (const [from, to] of segmentsOf(contour)) {
      const shares = [0, 1, ...Array.from({ length: 5 }, () => (seed = (seed + 0.618034) % 1))];
      for (const share of shares) {
        const [e, n] = [from[0] + share * (to[0] - from[0]), from[1] + share * (to[1] - from[1])];
        const settlement = surface.at([e, n])?.[FIELD.settlement] ?? NaN;
        const off = Math.abs(settlement - contour.level) / tolerance;
        if (!(off <= worst)) worst = off;
      }
    }
  }
  return worst;
}

function countOf(contours: readonly SettlementContour[], level: number): number {
  return contours.filter((contour) => contour.level === level).length;
}

describe('contours', () => {
  test('of a straight drive run where the closed form has them', () => {
    const surface = surfaceOf(aModel());
    const contours = settlementContours(surface, LEVELS);
    expect(contours.every(({ isClosed }) => isClosed)).toBe(true);
    // S_max is 16.92 mm, i 10 m
    expect(LEVELS.map((level) => countOf(contours, level))).toEqual([1, 1, 1, 1, 0, 0, 0]);
    for (const { level, line } of contours) {
      const far = 10 * Math.sqrt(2 * Math.log(0.0169197 / level));
      const abreast = segmentsOf({ level, line, isClosed: true }).flatMap(([from, to]) =>
        Math.abs(from[0]) < 400 && Math.abs(to[0]) < 400 ? [from, to] : [],
      );
      for (const [, n] of abreast) {
        const settlement = 0.0169197 * Math.exp(-(n * n) / 200);
        expect(Math.abs(settlement - level)).toBeLessThan(Math.max(0.02 * level, 0.0001));
      }
      const northings = line.map(([, n]) => n);
      expect(Math.max(...northings)).toBeCloseTo(far, 0);
      expect(Math.min(...northings)).toBeCloseTo(-far, 0);
    }
    expect(worstOf(surface, contours)).toBeLessThan(1);
  });

  test('leave out vertices of straight stretches', () => {
    const [contour] = settlementContours(surfaceOf(aModel()), [0.01]);
    expect(contour?.line.length).toBeLessThan(60);
  });

  test('cross the line of a drive where half the settlement of its end is left', () => {
    const surface = surfaceOf(aModel(), [400]);
    const half = 0.0169197 / 2;
    const contours = settlementContours(surface, [half, 0.001]);
    expect(worstOf(surface, contours)).toBeLessThan(1);
    const [contour] = contours;
    // the face stands at easting −100
    expect(Math.max(...(contour?.line.map(([e]) => e) ?? []))).toBeCloseTo(-100, 0);
  });

  test.each([
    ['gentle', -0.01],
    ['steep', 0.04],
  ])('of curved twin bores on a %s gradient keep to their levels', (_, gradient) => {
    const model = aModel(twinBores(gradient));
    const surface = surfaceOf(model);
    const contours = settlementContours(surface, LEVELS);
    expect(contours.length).toBeGreaterThan(4);
    expect(contours.every(({ isClosed }) => isClosed)).toBe(true);
    expect(worstOf(surface, contours)).toBeLessThan(1);
  });

  test('of bores far apart close round each by itself at higher levels', () => {
    const design = aDesign({
      bores: { kind: 'twin', spacing: 50, later: 'left', laterFactor: 1 },
    });
    const surface = surfaceOf(aModel(drivesOfDesign(design)));
    const contours = settlementContours(surface, [0.0005, 0.01]);
    expect([countOf(contours, 0.0005), countOf(contours, 0.01)]).toEqual([1, 2]);
    expect(worstOf(surface, contours)).toBeLessThan(1);
  });

  test('are no string of beads where a level is almost the largest settlement', () => {
    const askew = aDrive({ axis: [[-320, -245, -20], [320, 245, -20]] }); // prettier-ignore
    const surface = surfaceOf(aModel([askew]));
    for (const share of [0.9, 0.97, 0.98, 0.984, 0.986, 0.99, 0.995, 0.999, 0.9999]) {
      const contours = settlementContours(surface, [share * 0.0169197]);
      expect([share, contours.length]).toEqual([share, share < 0.9852 ? 1 : 0]);
      expect(worstOf(surface, contours)).toBeLessThan(1);
    }
  });

  test('keep to their level where it runs along a gradient of the largest settlement', () => {
    const surface = surfaceOf(aModel(twinBores(-0.01)));
    const levels = [0.0165, 0.018, 0.019, 0.02];
    const contours = settlementContours(surface, levels);
    expect(worstOf(surface, contours)).toBeLessThan(1);
    expect(contours.every(({ isClosed }) => isClosed)).toBe(true);
    expect(contours.length).toBeLessThan(10);
  });

  test('stay open where a drive comes out of the ground', () => {
    const rising = aDrive({ axis: [[-500, 0, -20], [0, 0, -20], [200, 0, 2]] }); // prettier-ignore
    const surface = surfaceOf(aModel([rising]));
    const contours = settlementContours(surface, [0.001, 0.01]);
    expect(contours.length).toBeGreaterThan(1);
    expect(contours.some(({ isClosed }) => isClosed)).toBe(false);
    expect(worstOf(surface, contours)).toBeLessThan(1);
  });

  test('of nothing are none', () => {
    expect(settlementContours(surfaceOf(aModel([])), LEVELS)).toEqual([]);
  });

  test('of wound twin bores across the grid ask the surface a bounded number of times', () => {
    const line = Array.from({ length: 51 }, (_, k): [number, number] => {
      const [along, across] = [20 * k, 60 * Math.sin(k / 20)];
      return [500_000 + 0.8 * along - 0.6 * across, 6_000_000 + 0.6 * along + 0.8 * across];
    });
    const bores = { kind: 'twin', spacing: 15, later: 'left', laterFactor: 1.1 } as const;
    const surface = surfaceOf(aModel(drivesOfDesign(aDesign({ line, bores }))));
    let asked = 0;
    const counting: GroundSurface = {
      ...surface,
      at: (point) => {
        asked += 1;
        return surface.at(point);
      },
    };
    const contours = settlementContours(counting, LEVELS);
    expect(worstOf(surface, contours)).toBeLessThan(1);
    expect(contours.reduce((sum, { line: ring }) => sum + ring.length, 0)).toBeLessThan(800);
    // 100 points a metre of drive; built for the browser, as many for five kilometres take about a second
    expect(asked).toBeLessThan(120_000);
  });
});
