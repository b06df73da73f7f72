import { at } from '../numerics/at.ts';
import { CENTRAL, type FivePosition } from '../numerics/range.ts';
import type { Wall } from '../building/wall.ts';
import { wallExtremes } from '../building/wall-extremes.ts';
import { nearestOnSegment } from '../geometry/nearest-on-segment.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { fieldAtPoints } from '../ground/field-at-points.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { FIELD } from '../ground/kernel.ts';
import { levelField } from '../ground/level-field.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { eOverGValues, type FieldsOverTroughWidth } from './bracket.ts';
import { breakpointFactor } from './breakpoint.ts';
import { loadedProfile } from './loaded-profile.ts';
import type { AssessmentRules } from './rules.ts';
import { directionOf, siteOfWall } from './wall-field.ts';

/**
 * The volume loss up to which a breakpoint is looked for.
 *
 * Units: m/m. Valid: a constant. Source: [common].
 */
export const LARGEST_VOLUME_LOSS = 0.1;

/**
 * The volume loss at which a wall or building reaches the category that leads on: the factor λ on the
 * central volume losses, the volume loss of the drive that gives most of the settlement there, the
 * position of K and the E/G that govern, and the reserve over the central and the high volume loss.
 *
 * Units: m/m and none. Valid: factor > 0. Source: [own].
 */
export type Breakpoint = {
  readonly factor: number;
  readonly drive: number;
  readonly volumeLoss: number;
  readonly position: FivePosition;
  readonly eOverG: number;
  readonly reserveOverCentral: number;
  readonly reserveOverHigh: number;
};

/**
 * The drive that gives most of the settlement at the wall's lowest point, with its volume loss there.
 *
 * Units: volume losses m/m. Valid: undefined without drives. Source: [own].
 */
export function drivePressingMost(
  model: GroundModel,
  fields: FieldsOverTroughWidth,
  wall: Wall,
  faces: readonly (number | undefined)[],
): { drive: number; central: number; high: number } | undefined {
  const field = fields[CENTRAL];
  if (field === undefined) return undefined;
  const factors = lossFactorsAt(model, 'central');
  const { profile, scale } = loadedProfile(field, factors);
  const lowest = wallExtremes(profile, scale, field.length).settlementMaxAt;
  const [tx, ty] = directionOf(wall, field.length);
  const point: PlanPoint = [
    wall.segment.start[0] + lowest * tx,
    wall.segment.start[1] + lowest * ty,
  ];
  const site = siteOfWall(model, wall);
  let [drive, largest] = [0, -1];
  for (const index of model.drives.keys()) {
    const alone = levelField(model, site, { position: CENTRAL, faces, onlyDrive: index });
    const settlement = at(
      fieldAtPoints(alone, Float64Array.from(point), factors),
      FIELD.settlement,
    );
    if (settlement > largest) [drive, largest] = [index, settlement];
  }
  let [nearest, loss] = [Infinity, { central: 0, high: 0 }];
  for (const piece of model.pieces[drive] ?? []) {
    const { distance } = nearestOnSegment(point, piece.plan);
    if (distance < nearest) [nearest, loss] = [distance, piece.volumeLoss];
  }
  return { drive, central: loss.central, high: loss.high };
}

/**
 * The breakpoint of a wall in one state of the ground: the smallest factor over low, central and high K
 * and every E/G. Undefined where none is reached up to a volume loss of 10 %.
 *
 * Units: see Breakpoint. Valid: `fields` belong to the wall and faces. Source: [own].
 */
export function breakpointOfWall(
  model: GroundModel,
  fields: FieldsOverTroughWidth,
  wall: Wall,
  rules: AssessmentRules,
  faces: readonly (number | undefined)[],
): Breakpoint | undefined {
  const pressing = drivePressingMost(model, fields, wall, faces);
  if (pressing === undefined || pressing.central === 0) return undefined;
  const factors = lossFactorsAt(model, 'central');
  const positions = new Set<FivePosition>(fields[0] === fields[4] ? [2] : [0, 2, 4]);
  let most = LARGEST_VOLUME_LOSS / pressing.central;
  let found: { factor: number; position: FivePosition; eOverG: number } | undefined;
  for (const position of positions) {
    const field = fields[position];
    if (field === undefined) continue;
    const loaded = loadedProfile(field, factors);
    for (const eOverG of eOverGValues(wall.eOverG)) {
      const factor = breakpointFactor(field, loaded, wall, eOverG, rules, most);
      if (factor !== undefined && factor < (found?.factor ?? Infinity)) {
        found = { factor, position, eOverG };
        most = factor;
      }
    }
  }
  if (found === undefined) return undefined;
  const volumeLoss = found.factor * pressing.central;
  return {
    ...found,
    drive: pressing.drive,
    volumeLoss,
    reserveOverCentral: found.factor - 1,
    reserveOverHigh: volumeLoss / pressing.high - 1,
  };
}
