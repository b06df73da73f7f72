import { describe, expect, test } from 'vitest';
import { checkFootprint } from '../../../server/imports/check-footprint.ts';

type Point = readonly [number, number];

function box(x: number, y: number, width: number, height = width): Point[] {
  return [[x, y], [x + width, y], [x + width, y + height], [x, y + height], [x, y]]; // prettier-ignore
}

function ring(...points: readonly Point[]): Point[] {
  return [...points, ...points.slice(0, 1)];
}

const YARD = box(5, 5, 10);

describe('rings whose edges do not cross', () => {
  test.each([
    ['a knot in a corner', [[ring([0, 0], [10, 10], [20, 20], [20, 0], [10, 10], [0, 12])]], 160],
    ['a knot on an edge', [[ring([0, 0], [20, 10], [20, 0], [10, 5], [0, 20])]], 150],
    [
      'a ring run through twice',
      [[ring([0, 0], [20, 0], [20, 20], [0, 20], [0, 0], [20, 0], [20, 20], [0, 20])]],
      400,
    ],
    ['one part twice', [[box(0, 0, 20)], [box(0, 0, 20)]], 400],
    ['a part on the edge of another', [[box(0, 0, 20)], [box(0, 5, 5)]], 400],
    ['parts that share two edges', [[box(0, 0, 20)], [box(10, 0, 20)]], 600],
    ['a hole twice', [[box(0, 0, 30), YARD, YARD]], 800],
    ['a hole in a hole', [[box(0, 0, 30), YARD, box(8, 8, 2)]], 800],
    ['a hole and half of it', [[box(0, 0, 30), YARD, box(5, 5, 5, 10)]], 800],
  ])('%s: their area is not counted twice', (_, footprint, area) => {
    const refused = checkFootprint(footprint, false);
    expect(refused).toMatchObject({ isRefused: true, isMended: true });
    expect(refused.remarks[0]).toMatch(/(crosses itself|lie over each other) near E .*mended/);
    const mended = checkFootprint(footprint, true);
    expect(mended).toMatchObject({ isRefused: false, isMended: true });
    expect(mended.area).toBeCloseTo(area, 6);
  });

  test.each([
    ['parts side by side', [[box(0, 0, 10)], [box(10, 0, 10)]], 200],
    ['an island in a yard', [[box(0, 0, 30), YARD], [box(8, 8, 2)]], 804],
    ['yards side by side', [[box(0, 0, 30), YARD, box(15, 5, 10)]], 700],
    ['a yard that touches a corner', [[box(0, 0, 20), ring([0, 0], [5, 8], [8, 4])]], 378],
    ['a part in the bay of another', [[ring([0, 0], [30, 0], [30, 30], [20, 30], [20, 10], [0, 10])], [box(0, 10, 20)]], 900],
    ['a ring that touches itself', [[ring([0, 0], [10, 0], [5, 5], [10, 10], [0, 10], [5, 5])]], 50],
    ['a ring that runs into its yard', [[ring([0, 0], [20, 0], [20, 20], [0, 20], [0, 0], [5, 8], [8, 4])]], 378],
    ['a ring with a spike along its edge', [[ring([0, 0], [10, 0], [5, 0], [10, 10], [0, 10])]], 75],
  ])('%s are taken as they are', (_, footprint, area) => {
    expect(checkFootprint(footprint, false)).toMatchObject({ isRefused: false, isMended: false, area });
  }); // prettier-ignore
});
