import { chainages } from '../geometry/chainages.ts';
import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import { pointAtChainage } from '../geometry/point-at-chainage.ts';
import { pointInPolygon } from '../geometry/point-in-polygon.ts';
import type { PlanPoint, Segment, SpacePoint } from '../geometry/point.ts';
import { polygonEdges } from '../geometry/polygon-edges.ts';
import { polylineParts } from '../geometry/polyline-parts.ts';
import { projectOntoPolyline } from '../geometry/project-onto-polyline.ts';
import { segmentDistance } from '../geometry/segment-distance.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { drivesOfDesign } from './drives-of-design.ts';

type Parts = readonly (readonly (readonly PlanPoint[])[])[];

/**
 * Where the tunnels of a designed line lie beside a building.
 *
 * Units: m; `depth` from the ground to the crown of the nearest tunnel at its nearest place, `distance` in
 * plan from the building's outline to the side of that tunnel. Valid: distance 0 where any of the tunnel is
 * underneath. Source: [own].
 */
export type TunnelsBeside = {
  readonly axes: readonly (readonly SpacePoint[])[];
  readonly depth: number;
  readonly distance: number;
};

function nearestPart(parts: Parts, axis: readonly SpacePoint[]): Segment & { off: number } {
  const edges = parts.flatMap((rings) => rings.flatMap((ring) => polygonEdges(ring)));
  let nearest = { start: [0, 0] as PlanPoint, end: [0, 0] as PlanPoint, off: Infinity };
  for (const { start, end } of polylineParts(axis)) {
    const isInside = parts.some((rings) => pointInPolygon(start, rings));
    const off = isInside
      ? 0
      : Math.min(...edges.map((edge) => segmentDistance(edge, { start, end })));
    if (off < nearest.off) nearest = { start, end, off };
  }
  return nearest;
}

/** The corner of a building that is nearest to a part of an axis. */
function nearestCorner(parts: Parts, part: Segment): PlanPoint {
  const corners = parts.flat(2);
  const [first = part.start, ...others] = corners;
  const off = (corner: PlanPoint) => nearestOnSegment(corner, part).distance;
  return others.reduce((best, one) => (off(one) < off(best) ? one : best), first);
}

/**
 * Where the tunnels of a designed line lie beside a building that stands on ground of a level.
 *
 * Units: m, levels above datum. Valid: at least one corner; throws as drivesOfDesign. The depth is told at the
 * building's corner nearest to the tunnel. Source: [own].
 */
export function tunnelsBeside(
  design: AlignmentDesign,
  parts: Parts,
  groundLevel: number,
): TunnelsBeside {
  const axes = drivesOfDesign(design).map(({ axis }) => axis);
  const found = axes.map((axis) => {
    const part = nearestPart(parts, axis);
    const stations = chainages(axis);
    const { chainage } = projectOntoPolyline(nearestCorner(parts, part), axis, stations);
    const [, , level] = pointAtChainage(axis, stations, chainage);
    return { off: part.off, level };
  });
  const nearest = found.reduce((best, one) => (one.off < best.off ? one : best));
  const radius = design.diameter / 2;
  return {
    axes,
    depth: Math.max(0, groundLevel - nearest.level - radius),
    distance: Math.max(0, nearest.off - radius),
  };
}
