import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import type { PlanPoint } from '../geometry/point.ts';
import type { PointOnLevel } from './trace-level.ts';

/**
 * A line without the vertices that it passes within their slack anyway.
 *
 * Units: m. Valid: at least two vertices; a closed line ends where it starts, and its first vertex stays.
 * Source: [common], after Douglas and Peucker, with a distance for each vertex.
 */
export function thinnedLine(line: readonly PointOnLevel[]): PlanPoint[] {
  const kept = new Set([0, line.length - 1]);
  const open: [first: number, last: number][] = [[0, line.length - 1]];
  for (let range = open.pop(); range !== undefined; range = open.pop()) {
    const [first, last] = range;
    const [start, end] = [line[first]?.point, line[last]?.point];
    if (start === undefined || end === undefined) continue;
    let [worst, excess] = [-1, 0];
    for (let k = first + 1; k < last; k++) {
      const vertex = line[k];
      if (vertex === undefined) continue;
      const { distance } = nearestOnSegment(vertex.point, { start, end });
      // in proportion, or the vertex farthest off would hide one with less slack
      const share = distance / Math.max(vertex.slack, Number.MIN_VALUE);
      if (share > Math.max(1, excess)) [worst, excess] = [k, share];
    }
    if (worst === -1) continue;
    kept.add(worst);
    open.push([first, worst], [worst, last]);
  }
  return line.filter((_, k) => kept.has(k)).map(({ point }) => point);
}
