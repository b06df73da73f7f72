import type { Range } from '../numerics/range.ts';
import type { GroundModel } from './ground-model.ts';

/**
 * The factor of each group of volume loss at the low, central or high end: all drives and intervals
 * move together.
 *
 * Units: none. Valid: any model. Source: [own].
 */
export function lossFactorsAt(model: GroundModel, end: keyof Range): number[] {
  return model.groups.map((group) => group.factors[end]);
}
