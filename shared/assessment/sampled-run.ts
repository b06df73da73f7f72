import type { Wall } from '../building/wall.ts';
import { CATEGORIES, type Category } from '../damage/categories.ts';
import { categoryOfStrain } from '../damage/category-of-strain.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import type { GroundState } from '../ground/level-field.ts';
import type { Recorder } from '../working.ts';
import { drawnEOverG, drawnInputs, drawnShares, type DrawnInputs } from './drawn-inputs.ts';
import { fieldsOverGrounds, type FieldsOverGrounds } from './fields-over-grounds.ts';
import type { AssessmentRules } from './rules.ts';
import { sampledGrounds } from './sampled-grounds.ts';
import { sampledCutOff, sampledProfile } from './sampled-profile.ts';
import { largestStrain, shapesOfWall } from './shapes-of-wall.ts';

/**
 * How many samples a sampled run draws.
 *
 * Units: none. Valid: a constant. Source: [common].
 */
export const SAMPLES = 500;

/**
 * What a sampled run finds of a building: of each sample the strain and which wall governs, and how many
 * samples come into each category; with what it drew and the fields of each wall, which its working opens.
 *
 * Units: strains m/m; worst are indices of the walls, −1 where none is strained. Valid: made by `sampledRun`;
 * the counts, from category 0 up, sum to the number of samples. Source: [own].
 */
export type SampledRun = {
  readonly shares: readonly Float64Array[];
  readonly samples: readonly DrawnInputs[];
  readonly fields: readonly FieldsOverGrounds[];
  readonly strains: readonly number[];
  readonly counts: readonly number[];
  readonly worst: readonly number[];
};

/**
 * The strain of a wall in one sample.
 *
 * Units: m/m. Valid: as `sampledProfile`; 0 where the wall is not affected. Source: as `largestStrain`.
 */
export function sampledStrain(
  model: GroundModel,
  fields: FieldsOverGrounds,
  drawn: DrawnInputs,
  rules: AssessmentRules,
  faces: GroundState['faces'],
): number {
  const loaded = sampledProfile(fields, drawn);
  if (loaded === null) return 0;
  const cutOff = sampledCutOff(model, fields, drawn, rules.cutOff, faces);
  const shapes = shapesOfWall(loaded, cutOff, rules);
  return largestStrain(shapes, fields.wall, drawnEOverG(fields.wall.eOverG, drawn.eOverG));
}

/**
 * Draws the likely inputs together, many times, and works the walls of a building out for each: all
 * walls with the same draw, the worst of them giving the sample's strain. Says how the category spreads
 * over the ranges that were given, which is no probability of damage.
 *
 * Units: faces chainages m. Valid: seed as `randomShares`; throws as `levelField`.
 * Source: mckay-beckman-conover-1979 for the draws, burland-1995 for the strain; the interpolation
 * between K is [own].
 */
export function sampledRun(
  model: GroundModel,
  walls: readonly Wall[],
  rules: AssessmentRules,
  faces: GroundState['faces'],
  seed: number,
  n = SAMPLES,
): SampledRun {
  const grounds = sampledGrounds(model);
  const shares = drawnShares(grounds, n, seed);
  const samples = drawnInputs(grounds, shares);
  const fields = walls.map((wall) => fieldsOverGrounds(model, wall, grounds, rules.cutOff, faces));
  const strains = samples.map(() => 0);
  const worst = samples.map(() => -1);
  for (const [index, ofWall] of fields.entries()) {
    for (const [k, drawn] of samples.entries()) {
      const strain = sampledStrain(model, ofWall, drawn, rules, faces);
      if (strain > (strains[k] ?? 0)) [strains[k], worst[k]] = [strain, index];
    }
  }
  const categories = strains.map((strain) => categoryOfStrain(strain));
  return {
    shares,
    samples,
    fields,
    strains,
    counts: CATEGORIES.map(({ category }) => categories.filter((one) => one === category).length),
    worst,
  };
}

/**
 * The share of the samples that come into a category.
 *
 * Units: none. Valid: at least one sample. Source: [own]; that every sample stands for an equal part is
 * mckay-beckman-conover-1979.
 */
export function shareInCategory(
  { counts, strains }: Pick<SampledRun, 'counts' | 'strains'>,
  category: Category,
  record?: Recorder,
): number {
  const [n_c, n] = [counts[category] ?? 0, strains.length];
  record?.({
    symbol: 'share',
    meaning: `share of the samples in category ${CATEGORIES[category]?.label ?? ''}`,
    expression: 'n_c / n',
    inputs: { n_c, n },
    value: n_c / n,
    unit: '',
    reference: 'own',
  });
  return n_c / n;
}

/**
 * The sample whose strain a share of the samples does not pass.
 *
 * Units: an index of the samples. Valid: 0 < share ≤ 1, at least one sample; the first of equals.
 * Source: [own].
 */
export function sampleAtShare({ strains }: Pick<SampledRun, 'strains'>, share: number): number {
  const ascending = [...strains].sort((a, b) => a - b);
  const wanted = ascending[Math.max(0, Math.ceil(share * ascending.length) - 1)];
  return strains.findIndex((strain) => strain === wanted);
}

/**
 * The wall that governs most samples and how many; null where nothing is strained in any.
 *
 * Units: an index of the walls. Valid: the first of equals. Source: [own].
 */
export function mostGoverning({
  worst,
}: Pick<SampledRun, 'worst'>): { readonly wall: number; readonly samples: number } | null {
  const counts = new Map<number, number>();
  for (const wall of worst) if (wall >= 0) counts.set(wall, (counts.get(wall) ?? 0) + 1);
  const [most] = [...counts].sort(([, a], [, b]) => b - a);
  return most === undefined ? null : { wall: most[0], samples: most[1] };
}
