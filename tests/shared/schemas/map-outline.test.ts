import { expect, test } from 'vitest';
import { registerFilterSchema } from '../../../shared/schemas/register.ts';

function taken(corners: unknown): boolean {
  return registerFilterSchema.safeParse({ inside: corners }).success;
}

function corners(count: number): readonly (readonly [number, number])[] {
  return Array.from({ length: count }, (_, k) => [3 + k / 1000, 54 + (k % 2) / 1000]);
}

test.each([3, 200])('an outline may have %i corners', (count) => {
  expect(taken(corners(count))).toBe(true);
});

test.each<[string, unknown]>([
  ['two corners', corners(2)],
  ['201 corners', corners(201)],
  ['a corner without latitude', [...corners(3), [3]]],
  ['a corner with a height', [...corners(3), [3, 54, 10]]],
  ['text for a figure', [...corners(3), ['3', 54]]],
  ['a longitude past 180', [...corners(3), [180.1, 54]]],
  ['a latitude past the pole', [...corners(3), [3, -90.1]]],
])('an outline is not taken with %s', (_, given) => {
  expect(taken(given)).toBe(false);
});
