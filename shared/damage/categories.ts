/**
 * A damage category as the method can tell it from strain; 4 stands for 4 to 5.
 *
 * Units: none. Valid: 0 to 4. Source: burland-broms-de-mello-1977, burland-1995.
 */
export type Category = 0 | 1 | 2 | 3 | 4;

/**
 * A damage category by name, the strain from which it is reached, and what repair it calls for in the
 * project's own words.
 *
 * Units: strain m/m. Valid: closed list. Source: limits boscardin-cording-1989 and burland-1995;
 * names and ease of repair burland-broms-de-mello-1977.
 */
export type CategoryRow = {
  readonly category: Category;
  readonly label: string;
  readonly name: string;
  readonly limitingStrain: number;
  readonly repair: string;
};

/**
 * The damage categories. Strain cannot tell 4 from 5.
 *
 * Units: strain m/m. Valid: from 0 up. Source: as CategoryRow.
 */
export const CATEGORIES: readonly CategoryRow[] = [
  {
    category: 0,
    label: '0',
    name: 'negligible',
    limitingStrain: 0,
    repair: 'Hairline cracks at most, which nobody need put right.',
  },
  {
    category: 1,
    label: '1',
    name: 'very slight',
    limitingStrain: 0.0005,
    repair: 'Fine cracks that ordinary redecoration covers; perhaps one in an outside wall.',
  },
  {
    category: 2,
    label: '2',
    name: 'slight',
    limitingStrain: 0.00075,
    repair:
      'Cracks that are easily filled before redecorating; outside joints may need pointing and a door or window easing.',
  },
  {
    category: 3,
    label: '3',
    name: 'moderate',
    limitingStrain: 0.0015,
    repair:
      'Cracks that a mason has to open and patch; doors and windows stick, pipes may break, the weather may get in.',
  },
  {
    category: 4,
    label: '4–5',
    name: 'severe to very severe',
    limitingStrain: 0.003,
    repair:
      'Parts of walls to be rebuilt, above all over openings; beams may lose bearing. At the worst the building needs shoring and rebuilding.',
  },
];
