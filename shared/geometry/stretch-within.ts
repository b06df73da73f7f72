import type { PlanPoint, Segment } from './point.ts';

/**
 * A straight line as a function of the distance along it.
 *
 * Units: m; `direction` without unit. Valid: direction of length 1, length ≥ 0. Source: [own].
 */
export type Line = {
  readonly start: PlanPoint;
  readonly direction: PlanPoint;
  readonly length: number;
};

/** Where a line's coordinate `from + rate · t` lies between `low` and `high`, as [first t, last t]. */
function between(from: number, rate: number, low: number, high: number): [number, number] {
  if (rate === 0)
    return from >= low && from <= high ? [-Infinity, Infinity] : [Infinity, -Infinity];
  const [a, b] = [(low - from) / rate, (high - from) / rate];
  return rate > 0 ? [a, b] : [b, a];
}

/**
 * The part of a straight line that lies within a distance of a segment. All points within a distance
 * of a segment make up a rectangle with two round ends; that is convex, so the part is one stretch
 * from the first to the last point in the rectangle or in an end.
 *
 * Units: m along the line from its start. Valid: any segment, reach ≥ 0; undefined where the line
 * keeps farther off. Source: [own], exact by quadratics.
 */
export function stretchWithin(
  line: Line,
  segment: Segment,
  reach: number,
): [from: number, to: number] | undefined {
  const [x, y] = line.start;
  const [ux, uy] = line.direction;
  let [from, to] = [Infinity, -Infinity];
  for (const [endX, endY] of [segment.start, segment.end]) {
    const along = (endX - x) * ux + (endY - y) * uy;
    const off = Math.abs((endY - y) * ux - (endX - x) * uy);
    if (off > reach) continue;
    const half = Math.sqrt((reach - off) * (reach + off));
    from = Math.min(from, along - half);
    to = Math.max(to, along + half);
  }
  const [dx, dy] = [segment.end[0] - segment.start[0], segment.end[1] - segment.start[1]];
  const length = Math.sqrt(dx * dx + dy * dy);
  if (length > 0) {
    const [ex, ey] = [dx / length, dy / length];
    const [px, py] = [x - segment.start[0], y - segment.start[1]];
    const beside = between(px * ex + py * ey, ux * ex + uy * ey, 0, length);
    const near = between(py * ex - px * ey, uy * ex - ux * ey, -reach, reach);
    const [a, b] = [Math.max(beside[0], near[0]), Math.min(beside[1], near[1])];
    if (a <= b) [from, to] = [Math.min(from, a), Math.max(to, b)];
  }
  from = Math.max(from, 0);
  to = Math.min(to, line.length);
  return from <= to ? [from, to] : undefined;
}
