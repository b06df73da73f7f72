import { mergeEdges } from '../geometry/merge-edges.ts';
import type { PlanPoint, Segment } from '../geometry/point.ts';
import { polygonEdges } from '../geometry/polygon-edges.ts';
import type { StraightTolerance } from '../geometry/straight-run-end.ts';

/**
 * How far edges of a footprint may depart from a line and still be one wall: 5 degrees and 0.2 m, with
 * jogs of up to 0.2 m between them.
 *
 * Units: radians and m. Valid: a constant. Source: [common].
 */
export const WALL_TOLERANCE: StraightTolerance = { angle: Math.PI / 36, offset: 0.2, jog: 0.2 };

/**
 * The walls of a footprint: its edges, nearly collinear ones merged, ring by ring.
 *
 * Units: m. Valid: outer ring and holes. Source: [own].
 */
export function wallsOfFootprint(
  rings: readonly (readonly PlanPoint[])[],
  tolerance: StraightTolerance = WALL_TOLERANCE,
): Segment[] {
  return rings.flatMap((ring) => mergeEdges(polygonEdges(ring), tolerance));
}
