import { sinkEnd, type SinkDrive, type SinkGround } from './point-sinks.ts';
import { sinkWidth } from './sink-width.ts';

/** Near enough that the distance from 25 m off is right to 1.3 mm. */
const AXIS_STEP = 0.5;

/** By how much a point within `radius` of another lies within so many widths of a drive in plan. */
export function reachOf(
  drives: readonly SinkDrive[],
  ground: SinkGround,
  widths: number,
  [E0, N0]: readonly [E: number, N: number],
  radius: number,
): (E: number, N: number) => number {
  const axis = drives.flatMap((drive) => {
    const end = sinkEnd(drive, ground);
    return Array.from({ length: Math.ceil(end / AXIS_STEP) + 1 }, (_, k) => {
      const s = Math.min(end, k * AXIS_STEP);
      const { E, N, level } = drive.path.at(s);
      return { E, N, reach: widths * sinkWidth(ground.rule, drive.K(s), ground.levels, level) };
    });
  });
  const near = axis.filter(({ E, N, reach }) => Math.hypot(E - E0, N - N0) < radius + reach);
  return (E, N) =>
    near.reduce((most, at) => Math.max(most, at.reach - Math.hypot(E - at.E, N - at.N)), -1);
}
