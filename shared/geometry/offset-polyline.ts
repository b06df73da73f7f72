import { MethodError } from '../method-error.ts';
import type { PlanPoint, SpacePoint } from './point.ts';
import { polylineParts } from './polyline-parts.ts';

/** 1 + cos of a turn within 0.0015 radians of turning back, where a mitre would have no end. */
const TURNED_BACK = 1e-6;

/**
 * How a vertex between two directions moves per metre of offset to the left, and by how much that
 * shortens the part on either side of it.
 */
function mitre(before: PlanPoint, after: PlanPoint): { shift: PlanPoint; shortening: number } {
  const turned = 1 + before[0] * after[0] + before[1] * after[1];
  if (turned < TURNED_BACK) return { shift: [0, 0], shortening: Infinity };
  return {
    shift: [-(before[1] + after[1]) / turned, (before[0] + after[0]) / turned],
    shortening: (before[0] * after[1] - before[1] * after[0]) / turned,
  };
}

/**
 * The polyline that runs beside another at a constant offset, positive to the left of its direction,
 * its joints mitred and its levels kept.
 *
 * Units: m. Valid: at least two points, no neighbours alike in plan (`zero-length`); throws
 * `outside-range`, with the vertex at its end as field, where the offset leaves nothing of a part or
 * turns it backwards, and where the line turns back on itself. Source: [own].
 */
export function offsetPolyline(axis: readonly SpacePoint[], offset: number): SpacePoint[] {
  const parts = polylineParts(axis);
  const moved: SpacePoint[] = [];
  let earlier = 0;
  for (const [k, [x, y, level]] of axis.entries()) {
    const before = parts[k - 1] ?? parts[k];
    const after = parts[k] ?? before;
    if (before === undefined || after === undefined) {
      throw new MethodError('outside-range', 'A polyline needs at least two points.');
    }
    const { shift, shortening } = mitre(before.direction, after.direction);
    if (!Number.isFinite(shortening)) {
      throw new MethodError('outside-range', `The line turns back at vertex ${k}.`, `[${k}]`);
    }
    if (k > 0 && before.length - offset * (earlier + shortening) <= 0) {
      const message = `An offset of ${offset} m leaves nothing of the part before vertex ${k}.`;
      throw new MethodError('outside-range', message, `[${k}]`);
    }
    earlier = shortening;
    moved.push([x + offset * shift[0], y + offset * shift[1], level]);
  }
  return moved;
}
