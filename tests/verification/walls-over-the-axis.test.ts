import { describe, expect, it } from 'vitest';
import { assessWall, type WallResult } from '../../shared/assessment/assess-wall.ts';
import type { SpacePoint } from '../../shared/geometry/point.ts';
import { aDrive, aModel, aWall, someRules } from '../support/builders.ts';

const I = 10;
/** V_s/(√(2π) i) of the drive of `aDrive`. */
const S_MAX = (0.015 * Math.PI * 9) / (Math.sqrt(2 * Math.PI) * I);

/** A wall with its middle over the axis and square to it, all turned by some degrees. */
function overAxis(degrees: number, length: number): WallResult {
  const angle = (degrees * Math.PI) / 180;
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  const axis: SpacePoint[] = [
    [-300 * c, -300 * s, -20],
    [300 * c, 300 * s, -20],
  ];
  const half = length / 2;
  const wall = aWall({ from: [s * half, -c * half], to: [-s * half, c * half] });
  return assessWall(aModel([aDrive({ axis })]), wall, someRules(), []);
}

function settlement(y: number): number {
  return S_MAX * Math.exp((-y * y) / (2 * I * I));
}

/** Every whole degree: where slope or curvature are 0 just at a node, rounding puts it on either side. */
const TURNS = Array.from({ length: 360 }, (_, degrees) => degrees);

describe(
  'attewell-woodman-1982, mair-taylor-burland-1996: a wall with its middle over the axis',
  { timeout: 60_000 },
  () => {
    it.each([10, 12.5, 20, 30, 40])(
      '%d m long: S_max, slope, Δ and zones at every turn',
      (length) => {
        const off = TURNS.flatMap((degrees) => {
          const { settlementMax, slopeMax, zones } = overAxis(degrees, length);
          const end = Math.min(I, length / 2);
          const sagging = zones.find(({ mode }) => mode === 'sagging');
          const delta = settlement(0) - settlement(end);
          const steepest = (settlement(end) * end) / (I * I);
          // profiles are right to 1e-7 of the settlement, to 1e-6 of the slope, an inflexion to 1e-4
          const right =
            zones.length === (length > 2 * I ? 3 : 1) &&
            Math.abs(settlementMax - S_MAX) < 1e-7 * S_MAX &&
            Math.abs(slopeMax - steepest) < 1e-6 * steepest &&
            Math.abs((sagging?.deflection ?? NaN) - delta) < 1e-4 * delta;
          return right
            ? []
            : [{ degrees, settlementMax, slopeMax, deflection: sagging?.deflection }];
        });
        expect(off).toEqual([]);
      },
    );
  },
);
