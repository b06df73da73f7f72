import { footprintMiddle } from '../building/footprint-middle.ts';
import type { GroundFrame } from './ground-frame.ts';
import { isInside } from './marks.ts';
import type { PlanBuilding } from './plan-material.ts';

/**
 * The buildings whose middle is on a sheet: those that it counts and writes on.
 *
 * Units: none. Valid: any frame. Source: [own].
 */
export function buildingsOn(
  { window, place }: GroundFrame,
  buildings: readonly PlanBuilding[],
): PlanBuilding[] {
  return buildings.filter(({ parts }) => isInside(window, place(footprintMiddle(parts))));
}
