import type { Wall } from '../../shared/building/wall.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import type { Drive } from '../../shared/ground/drive.ts';
import {
  groundModel,
  type GroundModel,
  type GroundRules,
} from '../../shared/ground/ground-model.ts';
import { certain } from '../../shared/numerics/range.ts';
import { DEFAULT_RULES, type AssessmentRules } from '../../shared/assessment/rules.ts';

/**
 * A drive: unless said otherwise D 6 m, V_L 1.5 %, K 0.5, straight and level along northing 0 from
 * easting −500 to 500, axis 20 m under datum, complete.
 */
export function aDrive(overrides: Partial<Drive> = {}): Drive {
  return {
    name: 'A',
    axis: [
      [-500, 0, -20],
      [500, 0, -20],
    ],
    diameter: 6,
    volumeLoss: certain(0.015),
    troughWidth: certain(0.5),
    intervals: [],
    faceShare: 0.5,
    laterFactor: 1,
    ...overrides,
  };
}

/**
 * A wall: unless said otherwise from (0, 2) to (0, 28), founded at a ground level of 0, 12 m high,
 * masonry.
 */
export function aWall(
  overrides: Partial<Wall> & { readonly from?: PlanPoint; readonly to?: PlanPoint } = {},
): Wall {
  const { from = [0, 2], to = [0, 28], ...others } = overrides;
  return {
    name: 'wall',
    segment: { start: from, end: to },
    groundLevel: 0,
    foundingLevel: 0,
    height: 12,
    eOverG: certain(2.6),
    poisson: 0.3,
    ...others,
  };
}

/** Drives made ready: one of `aDrive` unless said otherwise, clay and the axis as focus. */
export function aModel(
  drives: readonly Drive[] = [aDrive()],
  rules: Partial<GroundRules> = {},
): GroundModel {
  return groundModel(drives, { depth: { kind: 'clay' }, focus: 'axis', ...rules });
}

/** The default rules with some of them changed. */
export function someRules(overrides: Partial<AssessmentRules> = {}): AssessmentRules {
  return { ...DEFAULT_RULES, ...overrides };
}
