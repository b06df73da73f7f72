import { MethodError } from '../method-error.ts';
import { sine } from '../numerics/sine.ts';
import { commonFan, fanAround, fanHolds, type DirectionFan } from './direction-fan.ts';
import { planDistance } from './plan-distance.ts';
import type { PlanPoint } from './point.ts';
import type { PolylinePart } from './polyline-parts.ts';

/**
 * How far a run of parts may leave the line between its ends and still count as straight: no part by
 * more than `angle` in direction, no vertex by more than `offset`. A part no longer than `jog` may point
 * anywhere (0 where left out).
 *
 * Units: angle in radians, offset and jog m. Valid: 0 < angle ≤ π/4, offset > 0, jog ≥ 0. Source: [own].
 */
export type StraightTolerance = {
  readonly angle: number;
  readonly offset: number;
  readonly jog?: number;
};

/** The directions from a point in which a line passes a second point within an offset. */
function fanTowards(from: PlanPoint, to: PlanPoint, offset: number): DirectionFan | undefined {
  const distance = planDistance(from, to);
  if (distance <= offset) return undefined;
  const direction: PlanPoint = [(to[0] - from[0]) / distance, (to[1] - from[1]) / distance];
  return fanAround(direction, offset / distance);
}

/**
 * The index of the last part with which the run that begins at a part is straight. Every vertex and
 * every part allows the line from the run's start a fan of directions; the run ends at the last part
 * whose end lies in what all of them have in common. The own direction
 * of a jog says nothing. The search stops when nothing is left.
 *
 * Units: index. Valid: parts follow one another, `from` ≤ `last`, both inside the list; throws
 * `outside-range` for a tolerance outside its own range. Source: [own].
 */
export function straightRunEnd(
  parts: readonly PolylinePart[],
  from: number,
  last: number,
  { angle, offset, jog = 0 }: StraightTolerance,
): number {
  if (!(angle > 0 && angle <= Math.PI / 4 && offset > 0)) {
    throw new MethodError('outside-range', `No straightness of ${angle} rad and ${offset} m.`);
  }
  const sineOfAngle = sine(angle);
  const origin = parts[from]?.start ?? [0, 0];
  let end = from;
  let common: DirectionFan | undefined;
  for (let k = from; k <= last; k++) {
    const part = parts[k];
    if (part === undefined) break;
    const fans = [
      part.length > jog ? fanAround(part.direction, sineOfAngle) : undefined,
      fanTowards(origin, part.start, offset),
      fanTowards(origin, part.end, offset),
    ];
    for (const fan of fans) {
      if (fan === undefined) continue;
      common = common === undefined ? fan : commonFan(common, fan);
      if (common === undefined) return end;
    }
    const towardsEnd: PlanPoint = [part.end[0] - origin[0], part.end[1] - origin[1]];
    if (common !== undefined && fanHolds(common, towardsEnd)) end = k;
  }
  return end;
}
