import { expect, test } from 'vitest';
import { tunnelsBeside } from '../../../shared/assessment/tunnels-beside.ts';
import { aDesign } from '../../support/designs.ts';

function aSquare(east: number, north: number, side = 10) {
  return [[[[east, north], [east + side, north], [east + side, north + side], [east, north + side]]]] as const; // prettier-ignore
}

test('a tunnel underneath is no distance away, and the depth is to its crown', () => {
  const found = tunnelsBeside(aDesign(), aSquare(0, -5), 2);
  expect(found).toMatchObject({ distance: 0, depth: 2 + 20 - 3 });
  expect(found.axes).toHaveLength(1);
});

test('the distance is from the wall to the side of the nearer tunnel', () => {
  const bores = { kind: 'twin', spacing: 20, later: 'left', laterFactor: 1 } as const;
  const found = tunnelsBeside(aDesign({ bores }), aSquare(0, 30), 0);
  expect(found.axes).toHaveLength(2);
  expect(found.distance).toBeCloseTo(30 - 10 - 3, 6);
});

test('the depth is that of the place beside the building, and never above the ground', () => {
  const levels = [
    { chainage: 0, level: -10 },
    { chainage: 1000, level: -30 },
  ];
  const { depth } = tunnelsBeside(aDesign({ levels }), aSquare(250, 40, 0.001), 0);
  expect(depth).toBeCloseTo(25 - 3, 3);
  expect(tunnelsBeside(aDesign(), aSquare(0, 0), -30).depth).toBe(0);
});

test('a part of the line that ends inside of a building is underneath', () => {
  const line: [number, number][] = [
    [0, 0],
    [2, 0],
  ];
  expect(tunnelsBeside(aDesign({ line }), aSquare(-50, -50, 100), 0).distance).toBe(0);
});
