import type { PlanPoint } from '../geometry/point.ts';
import { polygonArea } from '../geometry/polygon-area.ts';

type Part = readonly (readonly PlanPoint[])[];

/**
 * The area of one part of a footprint: its outer ring less its holes, however they run.
 *
 * Units: m². Valid: the first ring is the outer one, holes lie inside it. Source: [own].
 */
export function partArea([outer = [], ...holes]: Part): number {
  return holes.reduce(
    (sum, hole) => sum - Math.abs(polygonArea(hole)),
    Math.abs(polygonArea(outer)),
  );
}

/**
 * The area of a footprint, all its parts together.
 *
 * Units: m². Valid: parts do not overlap. Source: [own].
 */
export function footprintArea(parts: readonly Part[]): number {
  return parts.reduce((sum, part) => sum + partArea(part), 0);
}
