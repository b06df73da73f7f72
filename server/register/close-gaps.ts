import { nearestOnSegment } from '../../shared/geometry/nearest-on-segment.ts';
import type { PlanPoint, Segment } from '../../shared/geometry/point.ts';
import { polygonEdges } from '../../shared/geometry/polygon-edges.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

/** Walls so far apart, in metres, are one that was surveyed twice. */
export const MOST_GAP = 0.05;
/** Where a corner was put on a wall it is on it but for rounding, in metres. */
const ROUNDING = 1e-6;

type Ring = readonly PlanPoint[];

function edgesOf(footprint: FootprintRings): Segment[] {
  return footprint.flat().flatMap(polygonEdges);
}

function eachRing(footprint: FootprintRings, change: (ring: Ring) => Ring): FootprintRings {
  return footprint.map((part) => part.map(change));
}

function isOne([x, y]: PlanPoint, [otherX, otherY]: PlanPoint): boolean {
  return x === otherX && y === otherY;
}

function along({ start, end }: Segment, share: number): PlanPoint {
  return [start[0] + share * (end[0] - start[0]), start[1] + share * (end[1] - start[1])];
}

/** A corner moved to the nearest corner within the gap, or else on to the nearest wall within it. */
function pulled(corner: PlanPoint, edges: readonly Segment[]): PlanPoint {
  let [best, least, isCorner]: [PlanPoint, number, boolean] = [corner, MOST_GAP, false];
  for (const edge of edges) {
    const distance = Math.hypot(corner[0] - edge.start[0], corner[1] - edge.start[1]);
    if (distance <= (isCorner ? least : MOST_GAP)) {
      [best, least, isCorner] = [edge.start, distance, true];
    }
    const wall = nearestOnSegment(corner, edge);
    if (!isCorner && wall.distance <= least) {
      [best, least] = [along(edge, wall.share), wall.distance];
    }
  }
  return best;
}

/** The corners that stand on an edge, or so near it, between its ends and in order. */
function between(edge: Segment, corners: readonly PlanPoint[], near: number): PlanPoint[] {
  return corners
    .map((corner) => ({ corner, ...nearestOnSegment(corner, edge) }))
    .filter(({ corner, share, distance }) => {
      const isEnd = isOne(corner, edge.start) || isOne(corner, edge.end);
      return !isEnd && distance <= near && share > 0 && share < 1;
    })
    .sort((a, b) => a.share - b.share)
    .map(({ corner }) => corner);
}

/** A footprint whose edges run by way of the corners that stand on them, or so near them. */
function withCorners(
  footprint: FootprintRings,
  corners: readonly PlanPoint[],
  near: number,
): FootprintRings {
  return eachRing(footprint, (ring) =>
    polygonEdges(ring).flatMap((edge) => [edge.start, ...between(edge, corners, near)]),
  );
}

/**
 * Two footprints whose walls meet where they stood so little apart, or reached so little over each
 * other: the second is moved on to the first, and both get the same corners along what they share.
 */
export function closedGaps(
  first: FootprintRings,
  second: FootprintRings,
): readonly [FootprintRings, FootprintRings] {
  const edges = edgesOf(first);
  const moved = eachRing(second, (ring) => ring.map((corner) => pulled(corner, edges)));
  const standing = withCorners(first, moved.flat(2), ROUNDING);
  return [standing, withCorners(moved, standing.flat(2), MOST_GAP)];
}
