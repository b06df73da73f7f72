import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import { planDistance } from '../geometry/plan-distance.ts';
import type { PlanPoint, Segment } from '../geometry/point.ts';
import { polygonEdges } from '../geometry/polygon-edges.ts';

/**
 * Walls so far apart are one that was surveyed twice.
 *
 * Units: m. Valid: read only. Source: [own].
 */
export const MOST_GAP = 0.05;
/** Where a corner was put on a wall it is on it but for rounding, in metres. */
const ROUNDING = 1e-6;

type Ring = readonly PlanPoint[];
type Footprint = readonly (readonly Ring[])[];

function edgesOf(footprint: Footprint): Segment[] {
  return footprint.flat().flatMap(polygonEdges);
}

function eachRing(footprint: Footprint, change: (ring: Ring) => Ring): Footprint {
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
    const distance = planDistance(corner, edge.start);
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
function withCorners(footprint: Footprint, corners: readonly PlanPoint[], near: number): Footprint {
  return eachRing(footprint, (ring) =>
    polygonEdges(ring).flatMap((edge) => [edge.start, ...between(edge, corners, near)]),
  );
}

/**
 * Two footprints whose walls meet where they stood so little apart, or reached so little over each
 * other: the second is moved on to the first, and both get the same corners along what they share.
 *
 * Units: m. Valid: walls at most MOST_GAP apart; what is farther stays as it is. Source: [own].
 */
export function closedGaps(first: Footprint, second: Footprint): readonly [Footprint, Footprint] {
  const edges = edgesOf(first);
  const moved = eachRing(second, (ring) => ring.map((corner) => pulled(corner, edges)));
  const standing = withCorners(first, moved.flat(2), ROUNDING);
  return [standing, withCorners(moved, standing.flat(2), MOST_GAP)];
}
