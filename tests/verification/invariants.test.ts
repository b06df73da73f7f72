import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { SpacePoint } from '../../shared/geometry/point.ts';
import type { Drive } from '../../shared/ground/drive.ts';
import { aDrive, aModel } from '../support/builders.ts';
import { bentAxes, drawnDrives, straightAxes } from '../support/drawn-schemes.ts';
import {
  deviations,
  expectShares,
  gridAbout,
  kernelMovements,
} from '../support/field-against-sinks.ts';
import { FAR_FROM_ORIGIN, motions, movePoint, moveSpacePoint } from '../support/plan-motion.ts';
import type { Movement } from '../support/point-sinks.ts';
import { holds, numbers } from '../support/property.ts';
import { cutAxis } from '../support/cut-axis.ts';

const GRID = gridAbout([0, 0], 40, 5);

/** All quantities to one share of their largest. */
function all(share: number): Record<keyof Movement, number> {
  return { S: share, slope: share, curvature: share, u: share, strain: share };
}

/** Rounding of some hundred terms, and the table's 1e-11 where pieces end elsewhere. */
const SAME = all(2e-10);

/** Without culling, which depends on how pieces stand together in blocks. */
function field(drives: readonly Drive[], points = GRID, faces: readonly number[] = []): Movement[] {
  const levels = { ground: 0, founding: -1 };
  const state = { position: 2, faces } as const;
  return kernelMovements(aModel(drives), levels, state, points, { culling: false });
}

function settlementAt(drive: Drive, E: number, N: number): number {
  return field([drive], Float64Array.of(E, N))[0]?.S ?? NaN;
}

/** The sum of two movements, quantity by quantity. */
function sumOf(a: Movement, b: Movement): Movement {
  return {
    S: a.S + b.S,
    slope: [a.slope[0] + b.slope[0], a.slope[1] + b.slope[1]],
    curvature: [
      a.curvature[0] + b.curvature[0],
      a.curvature[1] + b.curvature[1],
      a.curvature[2] + b.curvature[2],
    ],
    u: [a.u[0] + b.u[0], a.u[1] + b.u[1]],
    strain: [a.strain[0] + b.strain[0], a.strain[1] + b.strain[1], a.strain[2] + b.strain[2]],
  };
}

describe('attewell-woodman-1982 by pieces: what holds for any drive', () => {
  it('both sides of a straight drive are alike', () => {
    const cases = fc.tuple(drawnDrives(straightAxes), numbers(-150, 150), numbers(0, 60));
    holds(cases, ([drive, s, y]) => {
      const [E = 0, N = 0] = drive.axis[1] ?? [];
      const [cE, cN] = [E / 200, N / 200];
      const left = settlementAt(drive, s * cE - y * cN, s * cN + y * cE);
      const right = settlementAt(drive, s * cE + y * cN, s * cN - y * cE);
      expect(Math.abs(left - right)).toBeLessThan(2e-10 * settlementAt(drive, 0, 0));
    });
  });

  it('new-oreilly-1991: drives add up', () => {
    const cases = fc.tuple(drawnDrives(bentAxes), drawnDrives(bentAxes));
    holds(
      cases,
      ([a, b]) => {
        const other = field([b]);
        const sum = field([a]).map((movement, k) => sumOf(movement, other[k] ?? movement));
        expectShares(deviations(field([a, b]), sum), SAME);
      },
      20,
    );
  });

  it('settlement goes along when all is moved and turned, to where national grids are too', () => {
    const cases = fc.tuple(drawnDrives(bentAxes), motions);
    holds(
      cases,
      ([drive, motion]) => {
        const axis = drive.axis.map((vertex) => moveSpacePoint(motion, vertex));
        const there = Array.from({ length: GRID.length / 2 }, (_, k) =>
          movePoint(motion, [GRID[2 * k] ?? 0, GRID[2 * k + 1] ?? 0]),
        );
        const moved = field([{ ...drive, axis }], Float64Array.from(there.flat()));
        const { S } = deviations(moved, field([drive]));
        // the steepest slope of drawn drives is under 0.1
        expect(S.worst).toBeLessThan(0.1 * FAR_FROM_ORIGIN);
      },
      30,
    );
  });

  it('pieces cut in two change S by less than 0.1 % and 0.01 mm', () => {
    holds(
      drawnDrives(bentAxes),
      (drive) => {
        const halves = { ...drive, axis: cutAxis(drive.axis, 2) };
        const { S } = deviations(field([halves]), field([drive]));
        expect(S.share).toBeLessThan(0.001);
        expect(S.worst).toBeLessThan(1e-5);
      },
      30,
    );
  });

  it('a straight drive in 1,000 pieces is the drive in one, driven to any face', () => {
    const cases = fc.tuple(drawnDrives(straightAxes), numbers(180, 260));
    holds(
      cases,
      ([drive, face]) => {
        const pieces = { ...drive, axis: cutAxis(drive.axis, 1000) };
        expectShares(deviations(field([pieces], GRID, [face]), field([drive], GRID, [face])), SAME);
      },
      5,
    );
  });

  it('a bend of very large radius is the straight line', () => {
    const R = 1e7;
    const axis = Array.from({ length: 81 }, (_, k): SpacePoint => {
      const angle = (5 * (k - 40)) / R;
      return [R * Math.sin(angle), R * (1 - Math.cos(angle)), -20];
    });
    const straight = cutAxis([[-200, 0, -20], [200, 0, -20]], 1); // prettier-ignore
    // 100 m from its middle the bend is 0.5 mm off, which is 5e-5 of i
    const found = deviations(field([aDrive({ axis })]), field([aDrive({ axis: straight })]));
    expectShares(found, all(1e-4));
  });

  it('a drive given as two end to end is the drive', () => {
    const cases = fc.tuple(drawnDrives(bentAxes), fc.integer({ min: 1, max: 38 }));
    holds(
      cases,
      ([drive, vertex]) => {
        const first = { ...drive, axis: drive.axis.slice(0, vertex + 1) };
        const second = { ...drive, axis: drive.axis.slice(vertex) };
        expectShares(deviations(field([first, second]), field([drive])), SAME);
      },
      20,
    );
  });
});
