import { ringCrossing } from '../../shared/geometry/ring-crossing.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { lappedRings } from './lapped-rings.ts';

/** Rounding moves corners by less than this, in metres. */
const ROUNDING = 0.001;

/** Where edges of a footprint's rings cross; undefined where none do. */
export function crossingOfEdges(footprint: FootprintRings): PlanPoint | undefined {
  return ringCrossing(footprint.flat(), ROUNDING);
}

/** Where rings of a footprint cross or lie over themselves or each other; undefined where none does. */
export function crossingOfFootprint(footprint: FootprintRings): PlanPoint | undefined {
  return crossingOfEdges(footprint) ?? lappedRings(footprint);
}
