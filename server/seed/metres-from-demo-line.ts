import { nearestOnSegment } from '../../shared/geometry/nearest-on-segment.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import { polylineParts } from '../../shared/geometry/polyline-parts.ts';
import { DEMO_ALIGNMENTS } from './demo-alignments.ts';

const PARTS = polylineParts(DEMO_ALIGNMENTS[0]?.design.line ?? []);

/** How far off the demo's first line the middle of an outline lies, its first corner repeated. */
export function metresFromDemoLine(ring: readonly PlanPoint[]): number {
  const corners = ring.slice(1);
  const middle = [0, 1].map(
    (axis) => corners.reduce((sum, corner) => sum + (corner[axis] ?? 0), 0) / corners.length,
  );
  const [east = 0, north = 0] = middle;
  return Math.min(...PARTS.map((part) => nearestOnSegment([east, north], part).distance));
}
