import { planDistance } from '../geometry/plan-distance.ts';
import type { Segment } from '../geometry/point.ts';
import type { Range } from '../numerics/range.ts';

/**
 * A façade as a deep beam: a straight line in plan with its levels, its height from founding level to
 * eaves, the ratio E/G and Poisson's ratio.
 *
 * Units: lengths and levels m, eOverG and poisson without unit. Valid: height > 0, eOverG > 0,
 * 0 ≤ poisson ≤ 0.5. Source: burland-wroth-1974.
 */
export type Wall = {
  readonly name: string;
  readonly segment: Segment;
  readonly groundLevel: number;
  /** Whether the ground level was taken from beside a drive, not known at the wall. */
  readonly groundLevelAssumed?: boolean;
  readonly foundingLevel: number;
  readonly height: number;
  readonly eOverG: Range;
  readonly poisson: number;
};

/**
 * The length of a wall in plan.
 *
 * Units: m. Valid: any wall. Source: [own].
 */
export function wallLength(wall: Wall): number {
  return planDistance(wall.segment.start, wall.segment.end);
}
