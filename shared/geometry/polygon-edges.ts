import type { PlanPoint, Segment } from './point.ts';

/**
 * The edges of a ring in order, the last back to the first vertex. Whether the ring repeats its first
 * vertex at its end makes no difference.
 *
 * Units: m. Valid: any ring; a vertex that repeats the one before it makes no edge, so a ring of one
 * place has none. Source: [own].
 */
export function polygonEdges(ring: readonly PlanPoint[]): Segment[] {
  const edges: Segment[] = [];
  for (const [index, start] of ring.entries()) {
    const end = ring[index + 1] ?? ring[0];
    if (end === undefined || (start[0] === end[0] && start[1] === end[1])) continue;
    edges.push({ start, end });
  }
  return edges;
}
