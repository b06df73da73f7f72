import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import { pointInPolygon } from '../geometry/point-in-polygon.ts';
import type { PlanPoint, Segment } from '../geometry/point.ts';
import { polygonEdges } from '../geometry/polygon-edges.ts';
import { segmentDistance } from '../geometry/segment-distance.ts';

/**
 * What stands on the ground and at which levels: the lines of a wall or of a footprint, with the box
 * round them.
 *
 * Units: m, levels above datum. Valid: at least one line; foundingLevel ≤ groundLevel.
 * Source: [own].
 */
export type Place = {
  readonly lines: readonly Segment[];
  /** The rings of a footprint, none for a wall: what lies inside them is no distance away. */
  readonly rings: readonly (readonly PlanPoint[])[];
  readonly box: Box;
  readonly groundLevel: number;
  readonly foundingLevel: number;
};

/**
 * A place from its lines.
 *
 * Units: m. Valid: at least one line. Source: [own].
 */
export function placeOf(
  lines: readonly Segment[],
  groundLevel: number,
  foundingLevel: number,
): Place {
  const box = boundingBox(lines.flatMap((line) => [line.start, line.end]));
  return { lines, rings: [], box, groundLevel, foundingLevel };
}

/**
 * The place of a footprint from its outer ring and its holes.
 *
 * Units: m. Valid: at least one ring with an edge. Source: [own].
 */
export function placeOfFootprint(
  rings: readonly (readonly PlanPoint[])[],
  groundLevel: number,
  foundingLevel: number,
): Place {
  return { ...placeOf(rings.flatMap(polygonEdges), groundLevel, foundingLevel), rings };
}

/**
 * The shortest distance in plan from a place to a line, 0 for a line inside a footprint.
 *
 * Units: m. Valid: any line. Source: [own].
 */
export function distanceFromPlace(place: Place, line: Segment): number {
  if (pointInPolygon(line.start, place.rings)) return 0;
  return Math.min(...place.lines.map((own) => segmentDistance(own, line)));
}
