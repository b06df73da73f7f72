import { polygonEdges } from './polygon-edges.ts';
import type { PlanPoint, Segment } from './point.ts';

function crossesRay([x, y]: PlanPoint, { start, end }: Segment): boolean {
  const [x0, y0, x1, y1] = [start[0] - x, start[1] - y, end[0] - x, end[1] - y];
  if (y0 > 0 === y1 > 0) return false;
  return y1 > y0 === x0 * y1 - x1 * y0 > 0;
}

/**
 * Whether a point lies inside a polygon of any number of rings, by counting how often a ray towards
 * the east crosses them: inside an odd number of rings is inside, so that holes are outside.
 *
 * Units: none. Valid: rings closed or not, in any direction; a point on an edge may count either way.
 * Source: [common], the even-odd rule.
 */
export function pointInPolygon(
  point: PlanPoint,
  rings: readonly (readonly PlanPoint[])[],
): boolean {
  let inside = false;
  for (const ring of rings) {
    for (const edge of polygonEdges(ring)) {
      if (crossesRay(point, edge)) inside = !inside;
    }
  }
  return inside;
}
