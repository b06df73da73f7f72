import { averageHorizontalStrain, peakHorizontalStrain } from '../building/horizontal-strain.ts';
import { curvatureRuns, FLAT_CURVATURE, SHORTEST_ZONE } from '../building/curvature-runs.ts';
import { governingZone, strainedZone, type StrainedZone } from '../building/strained-zone.ts';
import { wallExtremes, type WallExtremes } from '../building/wall-extremes.ts';
import type { Wall } from '../building/wall.ts';
import { categoryOfStrain } from '../damage/category-of-strain.ts';
import type { Category } from '../damage/categories.ts';
import { rankinClass, type RankinClass } from '../damage/rankin.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { CENTRAL } from '../numerics/range.ts';
import type { Warning } from '../warnings.ts';
import { loadedProfile, type LoadedProfile } from './loaded-profile.ts';
import type { AssessmentRules } from './rules.ts';
import { shapesOfWall } from './shapes-of-wall.ts';
import { siteOfWall, wallField, type WallField } from './wall-field.ts';

/**
 * A zone with both of its horizontal strains, whichever counts.
 *
 * Units: m/m. Valid: finite. Source: burland-1995.
 */
export type AssessedZone = StrainedZone & {
  readonly averageHorizontalStrain: number;
  readonly peakHorizontalStrain: number;
};

/**
 * What one state of the ground does to a wall.
 *
 * Units: m and m/m; governingZone is an index, −1 without zones. Valid: never NaN. Source: the parts
 * cite theirs.
 */
export type WallResult = WallExtremes & {
  readonly zones: readonly AssessedZone[];
  readonly governingZone: number;
  readonly strain: number;
  readonly category: Category;
  readonly rankin: RankinClass;
  readonly warnings: readonly Warning[];
};

function warningsOf(
  { field, length }: WallField,
  { profile, scale }: LoadedProfile,
  wall: Wall,
  result: Pick<WallResult, 'settlementMax' | 'zones'>,
  rules: AssessmentRules,
): Warning[] {
  const warnings = [...field.warnings];
  if (wall.groundLevelAssumed === true) warnings.push('ground level assumed');
  if (result.zones.length > 0) return warnings;
  if (length < SHORTEST_ZONE) return [...warnings, 'short wall', 'not affected'];
  const ignored = rules.cutOff.kind === 'settlement' ? rules.cutOff.settlement : 0;
  const moves = result.settlementMax > 0 && result.settlementMax >= ignored;
  const flat = moves && curvatureRuns(profile, FLAT_CURVATURE / scale).length === 0;
  return flat
    ? [...warnings, 'flat along the wall', 'not affected']
    : [...warnings, 'not affected'];
}

/**
 * Zones, strains, category and Rankin's class of a wall that moves as a loaded profile.
 *
 * Units: m and m/m. Valid: `loaded` belongs to `field`; E/G at its central value. Source:
 * mair-taylor-burland-1996, burland-1995, rankin-1988.
 */
export function resultOfWall(
  field: WallField,
  loaded: LoadedProfile,
  wall: Wall,
  rules: AssessmentRules,
): WallResult {
  const { profile, scale } = loaded;
  const beam = { height: wall.height, eOverG: wall.eOverG.central, poisson: wall.poisson };
  const zones = shapesOfWall(loaded, field.cutOff, rules).map((shape) => ({
    ...strainedZone(shape, beam),
    averageHorizontalStrain: scale * averageHorizontalStrain(profile, shape.start, shape.end),
    peakHorizontalStrain: scale * peakHorizontalStrain(profile, shape.start, shape.end),
  }));
  const governing = governingZone(zones);
  const strain = zones[governing]?.strain ?? 0;
  const extremes = wallExtremes(profile, scale, field.length);
  return {
    ...extremes,
    zones,
    governingZone: governing,
    strain,
    category: categoryOfStrain(strain),
    rankin: rankinClass(extremes.slopeMax, extremes.settlementMax),
    warnings: warningsOf(
      field,
      loaded,
      wall,
      { zones, settlementMax: extremes.settlementMax },
      rules,
    ),
  };
}

/**
 * Assesses a wall at the central value of every input.
 *
 * Units: m and m/m; faces are chainages m. Valid: any wall; throws as `levelField`.
 * Source: as `resultOfWall`.
 */
export function assessWall(
  model: GroundModel,
  wall: Wall,
  rules: AssessmentRules,
  faces: readonly (number | undefined)[],
): WallResult {
  const site = siteOfWall(model, wall);
  const field = wallField(model, wall, site, rules.cutOff, { position: CENTRAL, faces });
  return resultOfWall(field, loadedProfile(field, lossFactorsAt(model, 'central')), wall, rules);
}
