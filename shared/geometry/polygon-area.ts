import { compensatedSum } from '../numerics/compensated-sum.ts';
import type { PlanPoint } from './point.ts';

function* crossProducts(ring: readonly PlanPoint[]): Iterable<number> {
  const [first, ...rest] = ring;
  if (first === undefined) return;
  let [x, y] = [0, 0];
  for (const vertex of rest) {
    const [nextX, nextY] = [vertex[0] - first[0], vertex[1] - first[1]];
    yield x * nextY;
    yield -y * nextX;
    [x, y] = [nextX, nextY];
  }
}

/**
 * The area of a ring, positive when its vertices run anticlockwise. Vertices are taken from the first
 * one, so that a small ring far from the origin keeps its digits.
 *
 * Units: m². Valid: any ring, closed or not; 0 for fewer than three vertices; where a ring crosses
 * itself its parts count by their turn. Source: [common], the shoelace formula.
 */
export function polygonArea(ring: readonly PlanPoint[]): number {
  return compensatedSum(crossProducts(ring)) / 2;
}
