import { governingZone, strainedZone, type StrainedZone } from '../building/strained-zone.ts';
import type { Wall } from '../building/wall.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { FIVE_POSITIONS, type FivePosition, type Range } from '../numerics/range.ts';
import { LOSS_LEVELS, type FieldsOverTroughWidth } from './bracket.ts';
import { loadedProfile } from './loaded-profile.ts';
import type { AssessmentRules } from './rules.ts';
import { shapesOfWall } from './shapes-of-wall.ts';

/**
 * The zone that governs a wall at one combination of the bracket, at the central E/G.
 *
 * Units: as StrainedZone. Valid: made by `bracketPoints`. Source: [own].
 */
export type BracketPoint = {
  readonly volumeLoss: keyof Range;
  readonly troughWidth: FivePosition;
  readonly zone: StrainedZone;
};

/**
 * The governing zone at each of the fifteen combinations of volume loss and K, for the chart of
 * deflection ratio against horizontal strain. A combination that does not affect the wall is left out.
 *
 * Units: m and m/m. Valid: `fields` belong to the wall. Source: burland-1995.
 */
export function bracketPoints(
  model: GroundModel,
  fields: FieldsOverTroughWidth,
  wall: Wall,
  rules: AssessmentRules,
): BracketPoint[] {
  const beam = { height: wall.height, eOverG: wall.eOverG.central, poisson: wall.poisson };
  return LOSS_LEVELS.flatMap((volumeLoss) => {
    const factors = lossFactorsAt(model, volumeLoss);
    return FIVE_POSITIONS.flatMap((troughWidth) => {
      const field = fields[troughWidth];
      if (field === undefined) return [];
      const shapes = shapesOfWall(loadedProfile(field, factors), field.cutOff, rules);
      const zones = shapes.map((shape) => strainedZone(shape, beam));
      const zone = zones[governingZone(zones)];
      return zone === undefined ? [] : [{ volumeLoss, troughWidth, zone }];
    });
  });
}
