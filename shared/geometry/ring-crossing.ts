import Flatbush from 'flatbush';
import type { PlanPoint, Segment } from './point.ts';
import { polygonEdges } from './polygon-edges.ts';

/** Signed distance of a point from the line through a segment, positive on its left. */
function aside({ start, end }: Segment, [x, y]: PlanPoint): number {
  const [dx, dy] = [end[0] - start[0], end[1] - start[1]];
  const length = Math.sqrt(dx * dx + dy * dy);
  return length === 0 ? 0 : (dx * (y - start[1]) - dy * (x - start[0])) / length;
}

function areBeyond(one: number, other: number, tolerance: number): boolean {
  return (one > tolerance && other < -tolerance) || (one < -tolerance && other > tolerance);
}

function crossingOf(a: Segment, b: Segment, tolerance: number): PlanPoint | undefined {
  const [start, end] = [aside(b, a.start), aside(b, a.end)];
  if (!areBeyond(start, end, tolerance)) return undefined;
  if (!areBeyond(aside(a, b.start), aside(a, b.end), tolerance)) return undefined;
  const share = start / (start - end);
  return [
    a.start[0] + share * (a.end[0] - a.start[0]),
    a.start[1] + share * (a.end[1] - a.start[1]),
  ];
}

/** Whether two edges run over each other for some length, as where a ring turns back on itself. */
function runsOver(a: Segment, b: Segment): boolean {
  if (aside(a, b.start) !== 0 || aside(a, b.end) !== 0) return false;
  const [dx, dy] = [a.end[0] - a.start[0], a.end[1] - a.start[1]];
  const along = ([x, y]: PlanPoint) => (x - a.start[0]) * dx + (y - a.start[1]) * dy;
  const [from, to] = [along(b.start), along(b.end)];
  return Math.min(dx * dx + dy * dy, Math.max(from, to)) > Math.max(0, Math.min(from, to));
}

/** Gives the edges after one whose boxes meet its own. */
function nearbyEdges(edges: readonly Segment[]): (at: number) => Segment[] {
  const index = new Flatbush(edges.length);
  const boxes = edges.map(({ start: [x0, y0], end: [x1, y1] }) => {
    const box = [Math.min(x0, x1), Math.min(y0, y1), Math.max(x0, x1), Math.max(y0, y1)] as const;
    index.add(...box);
    return box;
  });
  index.finish();
  return (at) => {
    const box = boxes[at];
    if (box === undefined) return [];
    return index.search(...box, (other) => other > at).flatMap((other) => edges[other] ?? []);
  };
}

/**
 * A place where rings cross themselves or each other by more than a tolerance; undefined where they do
 * not. Rings may touch in a point. Edges that run over each other reach over by nothing: they count as
 * crossing only where the tolerance is 0.
 *
 * Units: m. Valid: any rings, closed or not; the tolerance is not negative. Source: [own].
 */
export function ringCrossing(
  rings: readonly (readonly PlanPoint[])[],
  tolerance: number,
): PlanPoint | undefined {
  const edges = rings.flatMap((ring) => polygonEdges(ring));
  if (edges.length === 0) return undefined;
  const nearby = nearbyEdges(edges);
  for (const [at, edge] of edges.entries()) {
    for (const other of nearby(at)) {
      const crossing = crossingOf(edge, other, tolerance);
      if (crossing !== undefined) return crossing;
      if (tolerance === 0 && runsOver(edge, other)) return edge.start;
    }
  }
  return undefined;
}
