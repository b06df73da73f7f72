import { expect, test } from 'vitest';
import { placesById } from '../../../server/register/places-by-id.ts';

test.each([
  ['near each other', 0],
  ['far from each other', 2_000_000_000],
])('buildings with numbers %s are found where they stand', (_, far) => {
  const placeOf = placesById(Int32Array.of(7, 5, 9 + far));
  expect([5, 6, 7, 9 + far, 10 + far, -3].map(placeOf)).toEqual([1, -1, 0, 2, -1, -1]);
});

test('among none there is none', () => {
  expect(placesById(Int32Array.of())(0)).toBe(-1);
});
