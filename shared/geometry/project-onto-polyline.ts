import { MethodError } from '../method-error.ts';
import { at } from '../numerics/at.ts';
import { interpolate } from '../numerics/interpolate.ts';
import { nearestOnSegment } from './nearest-on-segment.ts';
import type { PlanPoint, SpacePoint } from './point.ts';
import { polylineParts, type PolylinePart } from './polyline-parts.ts';

/** Positive where b points to the left of a. */
function cross(a: PlanPoint, b: PlanPoint): number {
  return a[0] * b[1] - a[1] * b[0];
}

/**
 * Negative where a point is to the right of the line at its nearest point. Nearest to a vertex, it is
 * on the outer side of the turn there, which neither part by itself can tell.
 */
function sideOf(
  point: PlanPoint,
  parts: readonly PolylinePart[],
  k: number,
  share: number,
): number {
  const part = parts[k];
  if (part === undefined) return 0;
  const before = share === 0 ? (parts[k - 1] ?? part) : part;
  const after = share === 1 ? (parts[k + 1] ?? part) : part;
  const turn = cross(before.direction, after.direction);
  if (turn !== 0) return -turn;
  return cross(part.direction, [point[0] - part.start[0], point[1] - part.start[1]]);
}

/**
 * The nearest point of a polyline: its chainage, and how far off a point is, positive to the left of
 * the direction of growing chainage.
 *
 * Units: m. Valid: `chainages` as `chainages` gives them for this axis; of places equally near, the
 * first; beyond the ends the offset is the distance to the end, on the side of the part there
 * (straight ahead counts as left). Throws `outside-range` for an axis of fewer than two points.
 * Source: [own].
 */
export function projectOntoPolyline(
  point: PlanPoint,
  axis: readonly (PlanPoint | SpacePoint)[],
  chainages: Float64Array,
): { chainage: number; offset: number } {
  const parts = polylineParts(axis);
  if (parts.length === 0) {
    throw new MethodError('outside-range', 'An axis needs at least two points.');
  }
  let nearest = { share: 0, distance: Infinity };
  let index = 0;
  for (const [k, part] of parts.entries()) {
    const candidate = nearestOnSegment(point, part);
    if (!(candidate.distance < nearest.distance)) continue;
    nearest = candidate;
    index = k;
  }
  const { share, distance } = nearest;
  return {
    chainage: interpolate(at(chainages, index), at(chainages, index + 1), share),
    offset: distance > 0 && sideOf(point, parts, index, share) < 0 ? -distance : distance,
  };
}
