import type { Recorder } from '../working.ts';
import { atOrAbove } from './at-or-above.ts';
import { CATEGORIES, type Category } from './categories.ts';

/**
 * The strain from which a category is reached.
 *
 * Units: m/m. Valid: any category. Source: boscardin-cording-1989, burland-1995.
 */
export function limitingStrain(category: Category): number {
  return CATEGORIES[category]?.limitingStrain ?? 0;
}

/**
 * The damage category of a tensile strain. A strain on a limit belongs to the higher category.
 *
 * Units: m/m. Valid: any finite strain; 0 or less is category 0. Source: boscardin-cording-1989,
 * burland-1995.
 */
export function categoryOfStrain(strain: number, record?: Recorder): Category {
  let reached: Category = 0;
  for (const { category, limitingStrain: limit } of CATEGORIES) {
    if (category > 0 && atOrAbove(strain, limit)) reached = category;
  }
  const [c1, c2, c3, c4] = [
    limitingStrain(1),
    limitingStrain(2),
    limitingStrain(3),
    limitingStrain(4),
  ];
  record?.({
    symbol: 'category',
    meaning: 'number of limiting strains reached',
    expression: '(ε >= c1) + (ε >= c2) + (ε >= c3) + (ε >= c4)',
    inputs: { ε: strain, c1, c2, c3, c4 },
    value: reached,
    unit: '',
    reference: 'boscardin-cording-1989',
  });
  return reached;
}
