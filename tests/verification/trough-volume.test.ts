import { describe, expect, it } from 'vitest';
import type { Drive } from '../../shared/ground/drive.ts';
import { aModel } from '../support/builders.ts';
import { bentAxes, drawnDrives, pointsWithin, straightAxes } from '../support/drawn-schemes.ts';
import { gridAbout, kernelMovements } from '../support/field-against-sinks.ts';
import { holds } from '../support/property.ts';
import fc from 'fast-check';

function settlements(drive: Drive, points: Float64Array, culling = true): number[] {
  const levels = { ground: 0, founding: 0 };
  const state = { position: 2, faces: [] } as const;
  return kernelMovements(aModel([drive]), levels, state, points, { culling }).map(({ S }) => S);
}

function volumePerMetre({ volumeLoss, diameter }: Drive): number {
  return (volumeLoss.central * Math.PI * diameter * diameter) / 4;
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}

describe('attewell-woodman-1982: the volume of the trough', { timeout: 60_000 }, () => {
  it('across a straight drive is V_s per metre', () => {
    const cases = drawnDrives(straightAxes);
    holds(
      cases,
      (drive) => {
        const [E = 0, N = 0, level = 0] = drive.axis[1] ?? [];
        const [cE, cN] = [E / 200, N / 200];
        const step = (drive.troughWidth.central * -level) / 4;
        const steps = Array.from({ length: 65 }, (_, k) => (k - 32) * step);
        const across = Float64Array.from(steps.flatMap((y) => [-y * cN, y * cE]));
        const volume = sum(settlements(drive, across)) * step;
        // the trapezoidal rule at i/4 is exact for an error curve; 8 i away are 1e-15 of it
        expect(Math.abs(volume / volumePerMetre(drive) - 1)).toBeLessThan(1e-10);
      },
      50,
    );
  });

  it('of a whole drive, bent and on a gradient, is V_s for every metre of it', () => {
    holds(
      drawnDrives(bentAxes),
      (drive) => {
        const length = 5 * (drive.axis.length - 1);
        // i is 4 m and more: steps of i leave 2·exp(−2π²) = 5e-9
        const step = 4;
        const each = Math.ceil((length + 240) / step);
        const points = gridAbout([0, 0], ((each - 1) * step) / 2, each);
        const volume = sum(settlements(drive, points, false)) * step * step;
        expect(Math.abs(volume / (volumePerMetre(drive) * length) - 1)).toBeLessThan(2e-8);
      },
      4,
    );
  });

  it('is nowhere made up of heave', () => {
    holds(fc.tuple(drawnDrives(bentAxes), pointsWithin(200)), ([drive, point]) => {
      const [S] = settlements(drive, Float64Array.from(point));
      // Φ of the table may fall by its error, 1e-11, where it should rise
      expect(S).toBeGreaterThan(-1e-12);
    });
  });
});
