import { atOrAbove } from '../damage/at-or-above.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { gridInPolygon } from '../geometry/grid-in-polygon.ts';
import { fieldAtPoints } from '../ground/field-at-points.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { FIELD, FIELD_SIZE } from '../ground/kernel.ts';
import { levelField } from '../ground/level-field.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { placeOfFootprint } from '../ground/place.ts';
import { pointsNearDrives } from '../ground/points-near-drives.ts';
import { siteOf } from '../ground/site.ts';
import { troughWidthMatters } from '../ground/trough-width-matters.ts';
import { at } from '../numerics/at.ts';
import { CENTRAL, FIVE_POSITIONS } from '../numerics/range.ts';
import type { Warning } from '../warnings.ts';
import { basisOf, type Basis } from './basis.ts';
import { LOSS_LEVELS } from './bracket.ts';
import type { Moment } from './moment.ts';
import type { AssessmentRules } from './rules.ts';

/**
 * A building's outline on the ground: outer ring and holes, with its levels.
 *
 * Units: m, levels above datum. Valid: foundingLevel ≤ groundLevel. Source: [own].
 */
export type Footprint = {
  readonly rings: readonly (readonly PlanPoint[])[];
  readonly groundLevel: number;
  readonly foundingLevel: number;
};

/**
 * The settlement and slope under both of which a building passes out at stage 1.
 *
 * Units: settlement m, slope m/m. Valid: data of a scheme. Source: rankin-1988,
 * mair-taylor-burland-1996.
 */
export type ScreeningLimits = { readonly settlement: number; readonly slope: number };

/**
 * The limits a scheme starts with: 10 mm and 1 in 500.
 *
 * Units: m and m/m. Valid: read only. Source: rankin-1988, mair-taylor-burland-1996.
 */
export const DEFAULT_SCREENING_LIMITS: ScreeningLimits = { settlement: 0.01, slope: 1 / 500 };

/**
 * The screening of a building: the largest settlement and steepest slope anywhere in it over the whole
 * bracket and all moments, and whether it passes out.
 *
 * Units: m and m/m. Valid: never NaN. Source: mair-taylor-burland-1996.
 */
export type ScreeningResult = {
  readonly settlementMax: number;
  readonly slopeMax: number;
  readonly passes: boolean;
  readonly limits: ScreeningLimits;
  readonly warnings: readonly Warning[];
  readonly basis: Basis;
};

const POINTS_PER_WIDTH = 4;
const MOST_POINTS = 200_000;

function worstOf(values: Float64Array): { settlement: number; slope: number } {
  let [settlement, squared] = [0, 0];
  for (let o = 0; o < values.length; o += FIELD_SIZE) {
    const [east, north] = [at(values, o + FIELD.slopeEast), at(values, o + FIELD.slopeNorth)];
    settlement = Math.max(settlement, at(values, o + FIELD.settlement));
    squared = Math.max(squared, east * east + north * north);
  }
  return { settlement, slope: Math.sqrt(squared) };
}

/**
 * Screens a footprint: the greenfield at founding level at its corners, along its edges, on a grid of a
 * quarter of the trough width and at the points nearest each drive. With volume losses in proportion
 * the high one is the worst; where they are not, all three are tried.
 *
 * Units: m and m/m. Valid: throws as `levelField`. Source: mair-taylor-burland-1996.
 */
export function screenFootprint(
  model: GroundModel,
  footprint: Footprint,
  rules: AssessmentRules,
  limits: ScreeningLimits,
  moments: readonly Moment[],
): ScreeningResult {
  const { rings, groundLevel, foundingLevel } = footprint;
  const site = siteOf(model, placeOfFootprint(rings, groundLevel, foundingLevel));
  const levels = model.groups.length === 1 ? (['high'] as const) : LOSS_LEVELS;
  const positions = troughWidthMatters(model) ? FIVE_POSITIONS : [CENTRAL];
  const warnings = new Set<Warning>();
  let [settlementMax, slopeMax] = [0, 0];
  for (const { faces } of moments) {
    for (const position of positions) {
      const field = levelField(model, site, { position, faces });
      for (const warning of field.warnings) warnings.add(warning);
      if (field.packs.every(({ count }) => count === 0)) continue;
      const spacing = field.smallestWidth / POINTS_PER_WIDTH;
      const inside = gridInPolygon(rings, spacing, MOST_POINTS);
      const near = pointsNearDrives(field, site.place, spacing);
      for (const level of levels) {
        const factors = lossFactorsAt(model, level);
        for (const points of [inside, near]) {
          const { settlement, slope } = worstOf(fieldAtPoints(field, points, factors));
          settlementMax = Math.max(settlementMax, settlement);
          slopeMax = Math.max(slopeMax, slope);
        }
      }
    }
  }
  return {
    settlementMax,
    slopeMax,
    passes: !atOrAbove(settlementMax, limits.settlement) && !atOrAbove(slopeMax, limits.slope),
    limits,
    warnings: [...warnings],
    basis: basisOf(model, rules),
  };
}
