import { DEFAULT_RULES } from '../assessment/rules.ts';
import { fieldAtPoints } from '../ground/field-at-points.ts';
import { groundModel, type GroundModel } from '../ground/ground-model.ts';
import { levelField } from '../ground/level-field.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { placeOf } from '../ground/place.ts';
import { siteOf } from '../ground/site.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { CENTRAL, certain } from '../numerics/range.ts';

/**
 * The half length of the straight drive of the checks: far beyond the reach of any trough in them.
 *
 * Units: m. Valid: a constant. Source: [own].
 */
export const HALF_LENGTH = 1000;

/**
 * A level straight drive along the easting axis under level ground at 0, from −1000 to 1000 m, as the
 * published cases have it.
 *
 * Units: m, volumeLoss m/m. Valid: depth > diameter / 2. Source: [own].
 */
export function straightDrive(input: {
  diameter: number;
  axisDepth: number;
  troughWidth: number;
  volumeLoss: number;
}): GroundModel {
  const drive = {
    name: 'straight',
    axis: [
      [-HALF_LENGTH, 0, -input.axisDepth],
      [HALF_LENGTH, 0, -input.axisDepth],
    ] as const,
    diameter: input.diameter,
    volumeLoss: certain(input.volumeLoss),
    troughWidth: certain(input.troughWidth),
    intervals: [],
    faceShare: 0.5,
    laterFactor: 1,
  };
  return groundModel([drive], DEFAULT_RULES);
}

/**
 * The movement of the ground surface at a point over a straight drive, complete or with its face at a
 * chainage.
 *
 * Units: m; answer as FIELD. Valid: ground level 0. Source: attewell-woodman-1982.
 */
export function surfaceMovement(model: GroundModel, point: PlanPoint, face?: number): Float64Array {
  const site = siteOf(model, placeOf([{ start: point, end: point }], 0, 0));
  const field = levelField(model, site, { position: CENTRAL, faces: [face] });
  return fieldAtPoints(field, Float64Array.from(point), lossFactorsAt(model, 'central'));
}
