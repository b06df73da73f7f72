import type { Profile } from '../building/profile.ts';
import type { Wall } from '../building/wall.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { levelField, type GroundState, type LevelField } from '../ground/level-field.ts';
import type { Piece } from '../ground/piece.ts';
import type { Site } from '../ground/site.ts';
import { positionOf } from '../numerics/range.ts';
import type { CutOffRule } from './rules.ts';
import { isOfGround, type SampledGround } from './sampled-grounds.ts';
import { troughWidthHalves } from './trough-width-halves.ts';
import { computedLength, nodesAlong, profileOfPack, siteOfWall } from './wall-field.ts';

/**
 * The movement along a wall for unit volume losses of one ground at some K from low to central, or from
 * central to high.
 *
 * Units: none. Valid: one profile for each K. Source: [own].
 */
export type FieldsOverHalf = {
  readonly widths: readonly number[];
  readonly profiles: readonly Profile[];
};

/**
 * A wall with the movement that each ground gives it over the range of its K, all on the same nodes.
 *
 * Units: none. Valid: made by `fieldsOverGrounds`; a ground that does not reach the wall has no halves.
 * Source: [own].
 */
export type FieldsOverGrounds = {
  readonly wall: Wall;
  readonly site: Site;
  readonly grounds: readonly {
    readonly ground: SampledGround;
    readonly halves: readonly FieldsOverHalf[];
  }[];
};

const NO_PIECES: LevelField['packs'][number] = { pack: new Float64Array(), count: 0 };

/**
 * Computes the unit fields of a wall for each ground at some K, once for all samples.
 *
 * Units: faces chainages m. Valid: throws as `levelField`. Source: [own].
 */
export function fieldsOverGrounds(
  model: GroundModel,
  wall: Wall,
  grounds: readonly SampledGround[],
  cutOff: CutOffRule,
  faces: GroundState['faces'],
): FieldsOverGrounds {
  const site = siteOfWall(model, wall);
  const narrowest = levelField(model, site, { position: 0, faces }).smallestWidth;
  const nodes = nodesAlong(computedLength(wall), narrowest);
  const reaching = site.blocks.flatMap(({ pieces }) => pieces);
  const fieldsOf = (ground: SampledGround) => {
    const only = (piece: Piece) => isOfGround(model, ground, piece);
    const group = reaching.find(only)?.group;
    if (group === undefined) return { ground, halves: [] };
    const known = new Map<number, Profile>();
    const profileAt = (width: number): Profile => {
      const found = known.get(width);
      if (found !== undefined) return found;
      const position = positionOf(ground.troughWidth, width);
      const pack = levelField(model, site, { position, faces, only }).packs[group];
      const profile = profileOfPack(pack ?? NO_PIECES, wall, nodes);
      known.set(width, profile);
      return profile;
    };
    const halves = troughWidthHalves(ground.troughWidth, cutOff).map((widths) => ({
      widths,
      profiles: widths.map(profileAt),
    }));
    return { ground, halves };
  };
  return { wall, site, grounds: grounds.map(fieldsOf) };
}
