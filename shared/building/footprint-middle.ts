import type { PlanPoint } from '../geometry/point.ts';
import { partArea } from './footprint-area.ts';

/** Twice the area of a ring and its first moments, from a point near it so that digits are kept. */
function moments(ring: readonly PlanPoint[], [x0, y0]: PlanPoint): [number, number, number] {
  let [area, alongX, alongY] = [0, 0, 0];
  for (const [index, [x, y]] of ring.entries()) {
    const [nextX, nextY] = ring[index + 1] ?? ring[0] ?? [x, y];
    const [ax, ay, bx, by] = [x - x0, y - y0, nextX - x0, nextY - y0];
    const cross = ax * by - bx * ay;
    area += cross;
    alongX += (ax + bx) * cross;
    alongY += (ay + by) * cross;
  }
  const turn = area < 0 ? -1 : 1;
  return [area * turn, alongX * turn, alongY * turn];
}

/**
 * The middle of a building: the centre of area of its largest part, less the holes of it.
 *
 * Units: m. Valid: at least one part whose outer ring has a corner; a part of no area has its middle at
 * its first corner. Source: [own], the centroid of a polygon is [common].
 */
export function footprintMiddle(parts: readonly (readonly (readonly PlanPoint[])[])[]): PlanPoint {
  const [first = []] = parts;
  const largest = parts.reduce(
    (best, part) => (partArea(part) > partArea(best) ? part : best),
    first,
  );
  const origin = largest[0]?.[0] ?? [0, 0];
  let [area, alongX, alongY] = [0, 0, 0];
  for (const [index, ring] of largest.entries()) {
    const sign = index === 0 ? 1 : -1;
    const [a, x, y] = moments(ring, origin);
    area += sign * a;
    alongX += sign * x;
    alongY += sign * y;
  }
  if (!(area > 0)) return origin;
  return [origin[0] + alongX / (3 * area), origin[1] + alongY / (3 * area)];
}
