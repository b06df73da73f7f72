import type { Segment } from './point.ts';
import { polylineParts, type PolylinePart } from './polyline-parts.ts';
import { straightRunEnd, type StraightTolerance } from './straight-run-end.ts';

/** Cosines of turns nearer than this are taken as one, so that rounding chooses no corner. */
const SAME_TURN = 1e-9;

function cosineOfTurn(before: PolylinePart, after: PolylinePart): number {
  return before.direction[0] * after.direction[0] + before.direction[1] * after.direction[1];
}

/** The index of the part after the sharpest corner; of corners alike, the one farthest west, south. */
function sharpestCorner(parts: readonly PolylinePart[]): number {
  const corners = parts.map((part, k) => ({
    k,
    at: part.start,
    cosine: cosineOfTurn(parts.at(k - 1) ?? part, part),
  }));
  const sharpest = corners.reduce((least, { cosine }) => Math.min(least, cosine), 1);
  const [first] = corners
    .filter(({ cosine }) => cosine <= sharpest + SAME_TURN)
    .sort((a, b) => a.at[0] - b.at[0] || a.at[1] - b.at[1]);
  return first?.k ?? 0;
}

/**
 * The edges of a ring with nearly collinear neighbours made one: from the sharpest corner on, each
 * run as long as every vertex in it lies within `offset` of the line between its ends and every edge
 * within `angle` of it. The vertex that the ring is given from makes no difference; the result keeps
 * its order, beginning with the first run that starts at or after it.
 *
 * Units: m. Valid: the edges of one ring in order, as `polygonEdges` gives them; edges of no length
 * are dropped. A ring that bends all round keeps edges of at least each 2·angle of its turn.
 * Source: [own].
 */
export function mergeEdges(edges: readonly Segment[], tolerance: StraightTolerance): Segment[] {
  const parts = edges.filter(hasLength).flatMap(({ start, end }) => polylineParts([start, end]));
  const first = sharpestCorner(parts);
  const ring = [...parts.slice(first), ...parts.slice(0, first)];
  const merged: Segment[] = [];
  let beforeGivenStart = 0;
  for (let from = 0; from < ring.length;) {
    const end = straightRunEnd(ring, from, ring.length - 1, tolerance);
    const [head, tail] = [ring[from], ring[end]];
    if (head !== undefined && tail !== undefined) {
      merged.push({ start: head.start, end: tail.end });
    }
    if (first + from < ring.length) beforeGivenStart = merged.length;
    from = end + 1;
  }
  return [...merged.slice(beforeGivenStart), ...merged.slice(0, beforeGivenStart)];
}

function hasLength({ start, end }: Segment): boolean {
  return start[0] !== end[0] || start[1] !== end[1];
}
