import { nearestOnSegment } from './nearest-on-segment.ts';
import type { PlanPoint, Segment } from './point.ts';

function side(of: Segment, p: PlanPoint): number {
  const [dx, dy] = [of.end[0] - of.start[0], of.end[1] - of.start[1]];
  return Math.sign(dx * (p[1] - of.start[1]) - dy * (p[0] - of.start[0]));
}

/**
 * Whether two segments cross, each passing from one side of the other to the other side.
 *
 * Units: none. Valid: segments that only touch do not cross; their distance is 0 all the same.
 * Source: [own].
 */
export function segmentsCross(a: Segment, b: Segment): boolean {
  return side(a, b.start) * side(a, b.end) < 0 && side(b, a.start) * side(b, a.end) < 0;
}

/**
 * The shortest distance in plan between two segments, 0 where they cross.
 *
 * Units: m. Valid: any segments. Source: [own].
 */
export function segmentDistance(a: Segment, b: Segment): number {
  if (segmentsCross(a, b)) return 0;
  return Math.min(
    nearestOnSegment(a.start, b).distance,
    nearestOnSegment(a.end, b).distance,
    nearestOnSegment(b.start, a).distance,
    nearestOnSegment(b.end, a).distance,
  );
}
