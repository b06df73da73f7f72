import { planDistance } from './plan-distance.ts';
import type { PlanPoint, Segment } from './point.ts';

/**
 * Where on a segment a point's nearest point lies, as a share of its length from its start, and how
 * far off it is.
 *
 * Units: share 0 to 1, distance m. Valid: a segment of no length is taken as its start.
 * Source: [own].
 */
export function nearestOnSegment(
  point: PlanPoint,
  segment: Segment,
): { share: number; distance: number } {
  const [x, y] = segment.start;
  const [dx, dy] = [segment.end[0] - x, segment.end[1] - y];
  const squared = dx * dx + dy * dy;
  const along = squared === 0 ? 0 : ((point[0] - x) * dx + (point[1] - y) * dy) / squared;
  const share = Math.min(1, Math.max(0, along));
  return { share, distance: planDistance(point, [x + share * dx, y + share * dy]) };
}
