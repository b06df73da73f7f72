import type { Box } from '../../../shared/geometry/bounding-box.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';

function mayMeet(
  [e1, n1]: PlanPoint,
  [e2, n2]: PlanPoint,
  { west, south, east, north }: Box,
): boolean {
  return (
    Math.max(e1, e2) >= west &&
    Math.min(e1, e2) <= east &&
    Math.max(n1, n2) >= south &&
    Math.min(n1, n2) <= north
  );
}

/** The stretches of a line that may be seen in a box, each with the corners just outside. */
export function linesWithin(
  line: readonly PlanPoint[],
  box: Box,
): readonly (readonly PlanPoint[])[] {
  const found: PlanPoint[][] = [];
  let isOpen = false;
  for (const [k, point] of line.entries()) {
    const before = line[k - 1];
    const meets = before !== undefined && mayMeet(before, point, box);
    if (meets && !isOpen) found.push([before]);
    if (meets) found.at(-1)?.push(point);
    isOpen = meets;
  }
  return found;
}
