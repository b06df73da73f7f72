import type { PlanPoint } from './point.ts';

/**
 * The distance between two points in plan. (Math.hypot is not used: engines round it differently.)
 *
 * Units: m. Valid: finite points less than 1e150 m apart. Source: [own], Pythagoras.
 */
export function planDistance(a: PlanPoint, b: PlanPoint): number {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  return Math.sqrt(dx * dx + dy * dy);
}
