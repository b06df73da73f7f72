import { runningSums } from '../numerics/running-sums.ts';
import type { PlanPoint, SpacePoint } from './point.ts';
import { polylineParts } from './polyline-parts.ts';

/**
 * The plan length along a polyline from its first vertex to each of its vertices.
 *
 * Units: m. Valid: throws `zero-length`, with the vertex at fault as field, where a vertex lies on
 * the one before it in plan, as at a vertical part. Source: [own], sums after neumaier-1974.
 */
export function chainages(axis: readonly (PlanPoint | SpacePoint)[]): Float64Array {
  return runningSums(Float64Array.from(polylineParts(axis), (part) => part.length));
}
