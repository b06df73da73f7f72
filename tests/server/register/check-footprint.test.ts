import { describe, expect, test } from 'vitest';
import { checkedFootprint } from '../../../server/register/check-footprint.ts';

type Point = readonly [number, number];

function box(x: number, y: number, width: number, height = width): Point[] {
  return [[x, y], [x + width, y], [x + width, y + height], [x, y + height]]; // prettier-ignore
}

const YARD = box(5, 5, 10);

describe('a footprint drawn by hand', () => {
  test.each([
    ['a knot in a corner', [[[[0, 0], [10, 10], [20, 20], [20, 0], [10, 10], [0, 12]]]], 'crosses itself'],
    ['a courtyard twice', [[box(0, 0, 30), YARD, YARD]], 'crosses itself'],
    ['a courtyard in a courtyard', [[box(0, 0, 30), YARD, box(8, 8, 2)]], 'lie over each other'],
    ['a part in another', [[box(0, 0, 30)], [box(8, 8, 2)]], 'lie over each other'],
    ['a part in a part, corner on edge', [[box(0, 0, 20)], [[[20, 10], [10, 15], [10, 5]]]], 'lie over each other'],
    ['a courtyard beside it', [[box(0, 0, 30), box(40, 5, 5)]], 'A courtyard lies outside'],
  ] as const)('%s is refused', (_, footprint, words) => {
    expect(() => checkedFootprint(footprint)).toThrow(words);
  }); // prettier-ignore

  test.each([
    ['parts that touch in a corner', [[box(0, 0, 10)], [box(10, 10, 10)]]],
    ['an island in a courtyard', [[box(0, 0, 30), YARD], [box(8, 8, 2)]]],
    [
      'a courtyard that touches a wall',
      [
        [
          box(0, 0, 20),
          [
            [0, 10],
            [8, 14],
            [8, 6],
          ],
        ],
      ],
    ],
  ] as const)('%s is taken', (_, footprint) => {
    expect(checkedFootprint(footprint)).toHaveLength(footprint.length);
  });
});
