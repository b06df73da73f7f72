import { expect, test } from 'vitest';
import { DEFAULT_SENSITIVITY, sensitivityTotal } from '../../../shared/damage/sensitivity-score.ts';

test.each([
  [2, 1, 0, 3],
  [0, 0, 2, 2],
  [2, null, 1, 3],
  [null, 2, 2, 4],
])(
  'structure %s, features %s and category %i make %i',
  (structureScore, featuresScore, category, total) => {
    expect(sensitivityTotal({ structureScore, featuresScore }, category)).toBe(total);
  },
);

test('what nobody scored has no total', () => {
  expect(sensitivityTotal({ structureScore: null, featuresScore: null }, 2)).toBeUndefined();
});

test('a scheme begins with a reason for every score of either kind', () => {
  for (const reasons of Object.values(DEFAULT_SENSITIVITY)) {
    expect(new Set(reasons.map(({ score }) => score))).toEqual(new Set([0, 1, 2]));
  }
});
