import { MethodError } from '../method-error.ts';
import { planDistance } from './plan-distance.ts';
import type { PlanPoint, Segment, SpacePoint } from './point.ts';

/**
 * A straight part of a polyline in plan, with its length and its direction.
 *
 * Units: m; `direction` without unit. Valid: length > 0, direction of length 1. Source: [own].
 */
export type PolylinePart = Segment & { readonly length: number; readonly direction: PlanPoint };

/**
 * The parts of a polyline in order, one fewer than its vertices.
 *
 * Units: m. Valid: throws `zero-length`, with the vertex at fault as field, where a vertex lies on
 * the one before it in plan, as at a vertical part. Source: [own].
 */
export function polylineParts(axis: readonly (PlanPoint | SpacePoint)[]): PolylinePart[] {
  const parts: PolylinePart[] = [];
  let start: PlanPoint | undefined;
  for (const [index, [x, y]] of axis.entries()) {
    const end: PlanPoint = [x, y];
    if (start !== undefined) {
      const length = planDistance(start, end);
      if (!(length > 0)) {
        const message = `Vertex ${index} lies on vertex ${index - 1} in plan.`;
        throw new MethodError('zero-length', message, `[${index}]`);
      }
      const direction: PlanPoint = [(x - start[0]) / length, (y - start[1]) / length];
      parts.push({ start, end, length, direction });
    }
    start = end;
  }
  return parts;
}
