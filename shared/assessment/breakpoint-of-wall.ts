import { at } from '../numerics/at.ts';
import { CENTRAL, type FivePosition, type Range } from '../numerics/range.ts';
import type { Wall } from '../building/wall.ts';
import { wallExtremes } from '../building/wall-extremes.ts';
import { fieldAtPoints } from '../ground/field-at-points.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { FIELD } from '../ground/kernel.ts';
import { levelField } from '../ground/level-field.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import type { Piece } from '../ground/piece.ts';
import type { Site } from '../ground/site.ts';
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

type Pressing = { readonly drive: number; readonly volumeLoss: Range };

/** The drives that reach a site, each with every volume loss that it has there. */
function pressingAt(site: Site): Pressing[] {
  const found: Pressing[] = [];
  for (const { drive, volumeLoss } of site.blocks.flatMap(({ pieces }) => pieces)) {
    const known = found.some((one) => one.drive === drive && one.volumeLoss === volumeLoss);
    if (!known) found.push({ drive, volumeLoss });
  }
  return found;
}

/**
 * The drive that gives most of the settlement at the wall's lowest point, with the volume loss of its
 * lengths that give it.
 *
 * Units: volume losses m/m. Valid: undefined where no drive reaches the wall. Source: [own].
 */
export function drivePressingMost(
  model: GroundModel,
  fields: FieldsOverTroughWidth,
  wall: Wall,
  faces: readonly (number | undefined)[],
): Pressing | undefined {
  const field = fields[CENTRAL];
  if (field === undefined) return undefined;
  const site = siteOfWall(model, wall);
  const candidates = pressingAt(site);
  if (candidates.length < 2) return candidates[0];
  const factors = lossFactorsAt(model, 'central');
  const { profile, scale } = loadedProfile(field, factors);
  const lowest = wallExtremes(profile, scale, field.length).settlementMaxAt;
  const [tx, ty] = directionOf(wall);
  const [easting, northing] = wall.segment.start;
  const point = Float64Array.of(easting + lowest * tx, northing + lowest * ty);
  let [found, largest]: [Pressing | undefined, number] = [undefined, -1];
  for (const candidate of candidates) {
    const only = (piece: Piece) =>
      piece.drive === candidate.drive && piece.volumeLoss === candidate.volumeLoss;
    const alone = levelField(model, site, { position: CENTRAL, faces, only });
    const settlement = at(fieldAtPoints(alone, point, factors), FIELD.settlement);
    if (settlement > largest) [found, largest] = [candidate, settlement];
  }
  return found;
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
  if (pressing === undefined || pressing.volumeLoss.central === 0) return undefined;
  const factors = lossFactorsAt(model, 'central');
  const positions = new Set<FivePosition>(fields[0] === fields[4] ? [2] : [0, 2, 4]);
  let most = LARGEST_VOLUME_LOSS / pressing.volumeLoss.central;
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
  const volumeLoss = found.factor * pressing.volumeLoss.central;
  return {
    ...found,
    drive: pressing.drive,
    volumeLoss,
    reserveOverCentral: found.factor - 1,
    reserveOverHigh: volumeLoss / pressing.volumeLoss.high - 1,
  };
}
