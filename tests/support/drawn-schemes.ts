import fc from 'fast-check';
import type { Wall } from '../../shared/building/wall.ts';
import type { PlanPoint, SpacePoint } from '../../shared/geometry/point.ts';
import type { Drive } from '../../shared/ground/drive.ts';
import { certain } from '../../shared/numerics/range.ts';
import { aDrive, aWall } from './builders.ts';
import { numbers } from './property.ts';

/** The point half-way along a drawn axis is the origin, so that walls about it feel the drive. */
function centred(axis: readonly SpacePoint[]): SpacePoint[] {
  const [E, N] = axis[Math.floor(axis.length / 2)] ?? [0, 0];
  return axis.map(([e, n, level]): SpacePoint => [e - E, n - N, level]);
}

/** An axis of 200 to 300 m past the origin in chords of 5 m: any heading, bends down to 150 m. */
export const bentAxes: fc.Arbitrary<SpacePoint[]> = fc
  .record({
    heading: numbers(-Math.PI, Math.PI),
    turn: numbers(-1 / 30, 1 / 30),
    level: numbers(-30, -14),
    gradient: fc.oneof(fc.constant(0), numbers(-0.03, 0.03)),
    chords: fc.integer({ min: 40, max: 60 }),
  })
  .map(({ heading, turn, level, gradient, chords }) => {
    let [E, N] = [0, 0];
    const axis = Array.from({ length: chords + 1 }, (_, k): SpacePoint => {
      const vertex: SpacePoint = [E, N, level + 5 * gradient * (k - chords / 2)];
      E += 5 * Math.cos(heading + k * turn);
      N += 5 * Math.sin(heading + k * turn);
      return vertex;
    });
    return centred(axis);
  });

/** A straight level axis of 400 m through the origin. */
export const straightAxes: fc.Arbitrary<SpacePoint[]> = fc
  .record({ heading: numbers(-Math.PI, Math.PI), level: numbers(-30, -12) })
  .map(({ heading, level }) => {
    const [c, s] = [200 * Math.cos(heading), 200 * Math.sin(heading)];
    return [
      [-c, -s, level],
      [c, s, level],
    ];
  });

/** Drives of ordinary size on given axes, their inputs certain. Not shrunk: each case takes long. */
export function drawnDrives(axes: fc.Arbitrary<SpacePoint[]>): fc.Arbitrary<Drive> {
  const drives = fc
    .record({
      axis: axes,
      diameter: numbers(4, 8),
      volumeLoss: numbers(0.003, 0.03),
      troughWidth: numbers(0.4, 0.6),
      faceShare: fc.constantFrom(0.5, 0.275),
    })
    .map(({ volumeLoss, troughWidth, ...others }) =>
      aDrive({
        ...others,
        volumeLoss: certain(volumeLoss),
        troughWidth: certain(troughWidth),
      }),
    );
  return fc.noShrink(drives);
}

/** A point up to some distance from the origin. */
export function pointsWithin(reach: number): fc.Arbitrary<PlanPoint> {
  return fc.tuple(numbers(-reach, reach), numbers(-reach, reach));
}

/** Walls of 2 to 50 m at any angle with their middle within 30 m of the origin, 0 to 4 m deep. */
export const drawnWalls: fc.Arbitrary<Wall> = fc
  .noShrink(
    fc.record({
      middle: pointsWithin(30),
      angle: numbers(-Math.PI, Math.PI),
      half: numbers(1, 25),
      foundingLevel: numbers(-4, 0),
      height: numbers(4, 20),
      eOverG: fc.constantFrom(0.5, 2.6, 12.5),
    }),
  )
  .map(({ middle: [E, N], angle, half, eOverG, ...others }) => {
    const [c, s] = [half * Math.cos(angle), half * Math.sin(angle)];
    return aWall({ from: [E - c, N - s], to: [E + c, N + s], eOverG: certain(eOverG), ...others });
  });
