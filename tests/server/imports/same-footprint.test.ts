import { expect, test } from 'vitest';
import { isSameFootprint } from '../../../server/imports/same-footprint.ts';

type Point = readonly [number, number];

function box(x: number, y: number, width: number, height = width): Point[] {
  return [[x, y], [x + width, y], [x + width, y + height], [x, y + height], [x, y]]; // prettier-ignore
}

const HOUSE = [[box(0, 0, 20), box(5, 5, 5)]];
const [A, B, C, D] = box(0, 0, 20) as [Point, Point, Point, Point];

test.each([
  ['moved by 3 mm', [[box(0.003, 0, 20), box(5, 5, 5)]], true],
  ['moved by 7 mm', [[box(0.007, 0, 20), box(5, 5, 5)]], false],
  ['begun elsewhere', [[[C, D, A, B, C], box(5, 5, 5)]], true],
  ['with a corner more', [[[A, [10, 0], B, C, D, A], box(5, 5, 5)]], false],
  ['with other corners joined', [[[A, C, B, D, A], box(5, 5, 5)]], false],
  ['without its yard', [[box(0, 0, 20)]], false],
  ['with a part more', [...HOUSE, [box(40, 0, 5)]], false],
] as const)('a house %s', (_, other, isSame) => {
  expect(isSameFootprint(HOUSE, other)).toBe(isSame);
});

test('the order of parts and yards does not count', () => {
  const [yards, wing] = [[box(0, 0, 20), box(2, 2, 3), box(9, 9, 3)], [box(40, 0, 5)]] as const;
  expect(isSameFootprint([yards, wing], [wing, [yards[0], yards[2], yards[1]]])).toBe(true);
});
