import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import type { Segment } from '../geometry/point.ts';
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
  return { lines, box, groundLevel, foundingLevel };
}

/**
 * The shortest distance in plan from a place to a line.
 *
 * Units: m. Valid: any line; a line wholly inside a footprint is as far off as its nearest edge.
 * Source: [own].
 */
export function distanceFromPlace(place: Place, line: Segment): number {
  return Math.min(...place.lines.map((own) => segmentDistance(own, line)));
}
