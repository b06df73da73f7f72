import { ringCrossing } from '../../shared/geometry/ring-crossing.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

/** Rounding moves corners by less than this, in metres. */
const ROUNDING = 0.001;

/** Where rings of a footprint cross themselves or each other; undefined where none does. */
export function crossingOfFootprint(footprint: FootprintRings): PlanPoint | undefined {
  return ringCrossing(footprint.flat(), ROUNDING);
}
