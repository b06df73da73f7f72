import { describe, expect, it } from 'vitest';
import { atOrAbove } from '../../../shared/damage/at-or-above.ts';
import { CATEGORIES } from '../../../shared/damage/categories.ts';
import { categoryOfStrain, limitingStrain } from '../../../shared/damage/category-of-strain.ts';

/** The doubles next to 0.0005 and so on. */
function beside(limit: number): [below: number, above: number] {
  return [limit * (1 - Number.EPSILON), limit * (1 + Number.EPSILON)];
}

describe('categoryOfStrain: boscardin-cording-1989 and burland-1995', () => {
  it.each([
    [1, 0.0005],
    [2, 0.00075],
    [3, 0.0015],
    [4, 0.003],
  ] as const)(
    'category %d from a strain of %d: on the limit and one digit beside it',
    (category, limit) => {
      const [below, above] = beside(limit);
      expect(categoryOfStrain(below)).toBe(category - 1);
      expect(categoryOfStrain(limit)).toBe(category);
      expect(categoryOfStrain(above)).toBe(category);
      expect(limitingStrain(category)).toBe(limit);
    },
  );

  it('is negligible without strain, in compression and below 0.05 %', () => {
    for (const strain of [0, -0, -0.01, 0.000499]) expect(categoryOfStrain(strain)).toBe(0);
    expect(limitingStrain(0)).toBe(0);
  });

  it('does not tell severe from very severe', () => {
    expect(categoryOfStrain(0.1)).toBe(4);
    expect(CATEGORIES[4]?.label).toBe('4–5');
  });
});

describe('CATEGORIES', () => {
  it('are in order, with names and ease of repair', () => {
    expect(CATEGORIES.map(({ category }) => category)).toEqual([0, 1, 2, 3, 4]);
    expect(CATEGORIES.map(({ name }) => name)).toEqual([
      'negligible',
      'very slight',
      'slight',
      'moderate',
      'severe to very severe',
    ]);
    for (const { repair } of CATEGORIES) expect(repair).toMatch(/\.$/);
  });
});

describe('atOrAbove', () => {
  it('counts a figure on the limit as above it', () => {
    expect(atOrAbove(1, 1)).toBe(true);
    expect(atOrAbove(1 - Number.EPSILON, 1)).toBe(false);
    expect(atOrAbove(1 + Number.EPSILON, 1)).toBe(true);
  });
});
