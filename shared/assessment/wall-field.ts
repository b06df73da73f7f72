import { at } from '../numerics/at.ts';
import type { CutOff } from '../building/cut-off.ts';
import { NODE_STRIDE, profileFromNodes, type Profile } from '../building/profile.ts';
import { wallLength, type Wall } from '../building/wall.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { FIELD, FIELD_SIZE, sumPieces } from '../ground/kernel.ts';
import { levelField, type GroundState, type LevelField } from '../ground/level-field.ts';
import { placeOf } from '../ground/place.ts';
import { siteOf, type Site } from '../ground/site.ts';
import { stretchesWithinReach } from '../ground/stretches-within-reach.ts';
import type { PlanPoint } from '../geometry/point.ts';
import type { CutOffRule } from './rules.ts';

/**
 * The movement of the ground along a wall for unit volume losses, one profile per group, in one state
 * of the ground; what volume loss multiplies is computed only once.
 *
 * Units: length m. Valid: made by `wallField`. Source: [own].
 */
export type WallField = {
  readonly length: number;
  readonly profiles: readonly Profile[];
  readonly cutOff: CutOff;
  readonly field: LevelField;
};

/** Nodes per trough width: the error of a profile then stays under a ten-thousandth. */
const NODES_PER_WIDTH = 4;
const MOST_INTERVALS = 2000;

/**
 * The places along a wall at which the kernel is asked.
 *
 * Units: m. Valid: `smallestWidth` is the least trough width that the wall meets. Source: [own].
 */
export function nodesAlong(length: number, smallestWidth: number): Float64Array {
  const wanted = Math.ceil((length * NODES_PER_WIDTH) / smallestWidth);
  const intervals = Math.min(MOST_INTERVALS, Math.max(2, wanted));
  return Float64Array.from({ length: intervals + 1 }, (_, k) => (k * length) / intervals);
}

/** The kernel's answer resolved along a wall of direction (tx, ty). */
function resolve(one: Float64Array, tx: number, ty: number, into: Float64Array, o: number): void {
  const { slopeEast, slopeNorth, displacementEast, displacementNorth } = FIELD;
  into[o] = at(one, FIELD.settlement);
  into[o + 1] = at(one, slopeEast) * tx + at(one, slopeNorth) * ty;
  into[o + 2] =
    at(one, FIELD.curvatureEastEast) * tx * tx +
    2 * at(one, FIELD.curvatureEastNorth) * tx * ty +
    at(one, FIELD.curvatureNorthNorth) * ty * ty;
  into[o + 3] = at(one, displacementEast) * tx + at(one, displacementNorth) * ty;
  into[o + 4] =
    at(one, FIELD.strainEastEast) * tx * tx +
    2 * at(one, FIELD.strainEastNorth) * tx * ty +
    at(one, FIELD.strainNorthNorth) * ty * ty;
}

/**
 * The movement along a wall that one pack of pieces gives.
 *
 * Units: nodes m along the wall. Valid: packed for the wall's place. Source: attewell-woodman-1982; the
 * profile is [own].
 */
export function profileOfPack(
  { pack, count }: LevelField['packs'][number],
  wall: Wall,
  nodes: Float64Array,
): Profile {
  const { start } = wall.segment;
  const values = new Float64Array(nodes.length * NODE_STRIDE);
  const one = new Float64Array(FIELD_SIZE);
  const [tx, ty] = directionOf(wall);
  for (let k = 0; k < nodes.length; k++) {
    const x = at(nodes, k);
    sumPieces(pack, count, start[0] + x * tx, start[1] + x * ty, one);
    resolve(one, tx, ty, values, k * NODE_STRIDE);
  }
  return profileFromNodes(nodes, values);
}

/** A wall of no length is computed as if it were this long and ran east: it settles, and has no zone. */
const LEAST_LENGTH = 1e-6;

/**
 * The direction of a wall in plan from its start.
 *
 * Units: none. Valid: east for a wall of no length. Source: [own].
 */
export function directionOf(wall: Wall): PlanPoint {
  const { start, end } = wall.segment;
  const length = wallLength(wall);
  if (length < LEAST_LENGTH) return [1, 0];
  return [(end[0] - start[0]) / length, (end[1] - start[1]) / length];
}

/**
 * Where a wall stands, with the parts of the drives that reach it.
 *
 * Units: m. Valid: any wall. Source: [own].
 */
export function siteOfWall(model: GroundModel, wall: Wall): Site {
  return siteOf(model, placeOf([wall.segment], wall.groundLevel, wall.foundingLevel));
}

/**
 * The length of a wall for computing, which is never quite nothing.
 *
 * Units: m. Valid: any wall. Source: [own].
 */
export function computedLength(wall: Wall): number {
  return Math.max(LEAST_LENGTH, wallLength(wall));
}

/**
 * What of a wall a rule ignores under given drives.
 *
 * Units: m. Valid: `fields` packed for the wall's place, together all that reaches it. Source: as CutOff.
 */
export function cutOffOfWall(rule: CutOffRule, wall: Wall, fields: readonly LevelField[]): CutOff {
  if (rule.kind === 'settlement') return rule;
  const direction = directionOf(wall);
  const line = { start: wall.segment.start, direction, length: computedLength(wall) };
  return {
    kind: 'stretches',
    stretches: fields.flatMap((field) => stretchesWithinReach(field, line, rule.widths)),
  };
}

/**
 * The movement of the ground along a wall in one state.
 *
 * Units: m. Valid: `site` is the wall's; throws as `levelField`.
 * Source: attewell-woodman-1982; the profile is [own].
 */
export function wallField(
  model: GroundModel,
  wall: Wall,
  site: Site,
  cutOff: CutOffRule,
  state: GroundState,
): WallField {
  const field = levelField(model, site, state);
  const length = computedLength(wall);
  const nodes = nodesAlong(length, field.smallestWidth);
  const profiles = field.packs.map((pack) => profileOfPack(pack, wall, nodes));
  return { length, profiles, field, cutOff: cutOffOfWall(cutOff, wall, [field]) };
}
