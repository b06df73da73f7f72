import type { Wall } from '../building/wall.ts';
import { categoryOfStrain } from '../damage/category-of-strain.ts';
import type { Category } from '../damage/categories.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { troughWidthMatters } from '../ground/trough-width-matters.ts';
import {
  CENTRAL,
  FIVE_POSITIONS,
  isRange,
  type FivePosition,
  type Range,
} from '../numerics/range.ts';
import { loadedProfile } from './loaded-profile.ts';
import type { AssessmentRules } from './rules.ts';
import { largestStrain, shapesOfWall } from './shapes-of-wall.ts';
import { siteOfWall, wallField, type WallField } from './wall-field.ts';

/**
 * The three levels of volume loss in the bracket, in order.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const LOSS_LEVELS = ['low', 'central', 'high'] as const satisfies (keyof Range)[];

/**
 * The strains of a wall or building over the range of likely inputs: `strains[e][v][k]` for E/G, volume
 * loss (low, central, high) and the five positions of K.
 *
 * Units: strains m/m. Valid: eOverG lists low, central and high where given as a range, else one.
 * Source: [own].
 */
export type Bracket = {
  readonly eOverG: readonly number[];
  readonly strains: readonly (readonly (readonly number[])[])[];
};

/**
 * The movement along a wall at each of the five positions of K.
 *
 * Units: none. Valid: made by `fieldsOverTroughWidth`. Source: [own].
 */
export type FieldsOverTroughWidth = readonly WallField[];

/**
 * Computes the unit fields of a wall for each position of K, once for all that follows: bracket and
 * breakpoint only recombine them.
 *
 * Units: faces chainages m. Valid: throws as `levelField`. Source: [own].
 */
export function fieldsOverTroughWidth(
  model: GroundModel,
  wall: Wall,
  rules: AssessmentRules,
  faces: readonly (number | undefined)[],
): FieldsOverTroughWidth {
  const site = siteOfWall(model, wall);
  const fieldAt = (position: FivePosition) =>
    wallField(model, wall, site, rules.cutOff, { position, faces });
  // where nothing reaches the wall, no K changes that
  const isReached = site.blocks.length > 0;
  if (isReached && troughWidthMatters(model)) return FIVE_POSITIONS.map(fieldAt);
  const only = fieldAt(CENTRAL);
  return FIVE_POSITIONS.map(() => only);
}

/**
 * The values of E/G that a bracket holds.
 *
 * Units: none. Valid: an ordered range. Source: [own].
 */
export function eOverGValues(eOverG: Range): number[] {
  return isRange(eOverG) ? [eOverG.low, eOverG.central, eOverG.high] : [eOverG.central];
}

/**
 * The bracket of a wall: its largest strain at three volume losses and five K, all intervals of all
 * drives moving together, and at each E/G.
 *
 * Units: m/m. Valid: `fields` belong to the wall. Source: [own].
 */
export function bracketOfWall(
  model: GroundModel,
  fields: FieldsOverTroughWidth,
  wall: Wall,
  rules: AssessmentRules,
): Bracket {
  const eOverG = eOverGValues(wall.eOverG);
  const perLevel = LOSS_LEVELS.map((level) => {
    const factors = lossFactorsAt(model, level);
    const known = new Map<WallField, number[]>();
    return fields.map((field) => {
      const found = known.get(field);
      if (found !== undefined) return found;
      const shapes = shapesOfWall(loadedProfile(field, factors), field.cutOff, rules);
      const strains = eOverG.map((ratio) => largestStrain(shapes, wall, ratio));
      known.set(field, strains);
      return strains;
    });
  });
  return {
    eOverG,
    strains: eOverG.map((_, e) => perLevel.map((row) => row.map((strains) => strains[e] ?? 0))),
  };
}

/**
 * The bracket of a building: at each combination the worst of its walls and moments. A wall with one
 * E/G stands for every E/G of the others.
 *
 * Units: m/m. Valid: at least one bracket. Source: [own].
 */
export function worstBracket(brackets: readonly Bracket[]): Bracket {
  const widest = brackets.reduce((a, b) => (b.eOverG.length > a.eOverG.length ? b : a));
  const strains = widest.strains.map((levels, e) =>
    levels.map((row, v) =>
      row.map((_, k) =>
        Math.max(...brackets.map((b) => (b.strains[e] ?? b.strains[0])?.[v]?.[k] ?? 0)),
      ),
    ),
  );
  return { eOverG: widest.eOverG, strains };
}

/**
 * The categories of a bracket at each volume loss and K, the worst over E/G.
 *
 * Units: none. Valid: any bracket. Source: boscardin-cording-1989, burland-1995.
 */
export function bracketCategories(bracket: Bracket): Category[][] {
  return LOSS_LEVELS.map((_, v) =>
    FIVE_POSITIONS.map((k) =>
      categoryOfStrain(Math.max(...bracket.strains.map((levels) => levels[v]?.[k] ?? 0))),
    ),
  );
}
