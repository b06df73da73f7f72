import type { PlanPoint } from './point.ts';
import { polygonEdges } from './polygon-edges.ts';
import type { Line } from './stretch-within.ts';

/**
 * The stretches of a straight line that lie inside a polygon of any number of rings: inside an odd number
 * of rings is inside, so that holes are outside.
 *
 * Units: m along the line from its start, in order. Valid: rings closed or not, in any direction; edges
 * that run along the line count either way; stretches that only touch are left out. Source: [common], the
 * even-odd rule.
 */
export function stretchesInPolygon(
  { start: [x, y], direction: [ux, uy], length }: Line,
  rings: readonly (readonly PlanPoint[])[],
): [from: number, to: number][] {
  const crossings: number[] = [];
  for (const { start, end } of rings.flatMap((ring) => polygonEdges(ring))) {
    const before = ux * (start[1] - y) - uy * (start[0] - x);
    const after = ux * (end[1] - y) - uy * (end[0] - x);
    // an edge owns its lower end only, so that a corner on the line is met once
    if (before > 0 === after > 0) continue;
    const share = before / (before - after);
    const east = start[0] + share * (end[0] - start[0]) - x;
    const north = start[1] + share * (end[1] - start[1]) - y;
    crossings.push(east * ux + north * uy);
  }
  crossings.sort((a, b) => a - b);
  const stretches: [number, number][] = [];
  for (let k = 0; k + 1 < crossings.length; k += 2) {
    const from = Math.max(0, crossings[k] ?? 0);
    const to = Math.min(length, crossings[k + 1] ?? 0);
    if (from < to) stretches.push([from, to]);
  }
  return stretches;
}
