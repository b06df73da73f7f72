import type { RunResult } from '../schemas/runs.ts';
import type { BuildingOutcome } from './outcome-of-building.ts';

/**
 * The record of what a run found of a building.
 *
 * Units: as RunResult. Valid: any outcome; the same outcome gives the same record. Source: [own].
 */
export function resultOfOutcome({ strain, ...outcome }: BuildingOutcome): RunResult {
  const breakpoint = strain?.breakpoint ?? null;
  const governing = strain?.governing ?? null;
  return {
    stage: outcome.stage,
    settlement: outcome.settlement,
    slope: outcome.slope,
    strainLow: strain?.strain.low ?? null,
    strain: strain?.strain.central ?? null,
    strainHigh: strain?.strain.high ?? null,
    categoryLow: strain?.category.low ?? null,
    category: strain?.category.central ?? null,
    categoryHigh: strain?.category.high ?? null,
    rankin: strain?.rankin ?? null,
    wallSettlement: strain?.settlement ?? null,
    wallSlope: strain?.slope ?? null,
    breakpoint: breakpoint?.factor ?? null,
    breakpointVolumeLoss: breakpoint?.volumeLoss ?? null,
    reserve: breakpoint?.reserveOverCentral ?? null,
    reserveOverHigh: breakpoint?.reserveOverHigh ?? null,
    isSettled: strain?.isSettled ?? null,
    sensitiveTo: strain?.sensitiveTo ?? null,
    governingWall: governing?.wall ?? null,
    isRow: governing?.isRow ?? null,
    mode: governing?.mode ?? null,
    deflectionRatio: governing?.deflectionRatio ?? null,
    horizontalStrain: governing?.horizontalStrain ?? null,
    heldBy: [...outcome.heldBy],
    assumed: [...outcome.assumed],
    warnings: [...outcome.warnings],
    fault: outcome.fault,
    chainage: outcome.place?.chainage ?? null,
    offset: outcome.place?.offset ?? null,
  };
}
