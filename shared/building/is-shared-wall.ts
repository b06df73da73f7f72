import type { PlanPoint } from '../geometry/point.ts';
import type { PolylinePart } from '../geometry/polyline-parts.ts';
import { sine } from '../numerics/sine.ts';
import type { RowTolerance } from './row-tolerance.ts';

function along(line: PolylinePart, [x, y]: PlanPoint): PlanPoint {
  const [ux, uy] = line.direction;
  const [dx, dy] = [x - line.start[0], y - line.start[1]];
  return [dx * ux + dy * uy, dy * ux - dx * uy];
}

/**
 * Whether two walls stand against each other: parallel in either direction within `angle`, no more
 * than `offset` apart where they run side by side, and side by side for more than `overlap`. All is
 * measured along the longer one.
 *
 * Units: m. Valid: walls of some length; of two equally long, along the first. Source: [own].
 */
export function isSharedWall(
  a: PolylinePart,
  b: PolylinePart,
  { angle, offset, overlap }: RowTolerance,
): boolean {
  const turn = a.direction[0] * b.direction[1] - a.direction[1] * b.direction[0];
  if (Math.abs(turn) > sine(angle)) return false;
  const [line, other] = a.length >= b.length ? [a, b] : [b, a];
  const ends = [along(line, other.start), along(line, other.end)] as const;
  const [[x0, y0], [x1, y1]] = ends[0][0] <= ends[1][0] ? ends : [ends[1], ends[0]];
  const from = Math.max(0, x0);
  const to = Math.min(line.length, x1);
  if (!(to - from > overlap)) return false;
  const slope = (y1 - y0) / (x1 - x0);
  return Math.abs(y0 + slope * (from - x0)) <= offset && Math.abs(y0 + slope * (to - x0)) <= offset;
}
