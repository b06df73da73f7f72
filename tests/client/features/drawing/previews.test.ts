// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { footprintArea } from '../../../../shared/building/footprint-area.ts';
import type { Parts } from '../../../../src/features/drawing/drafts/draft.ts';
import { splitLine } from '../../../../src/features/drawing/drafts/split-line.ts';
import { splitPreview } from '../../../../src/features/drawing/drafts/split-preview.ts';

const [E, N] = [412500, 6068300];

function box(east: number, north: number, width: number, height: number): Parts[number][number] {
  const [x, y] = [E + east, N + north];
  return [
    [x, y],
    [x + width, y],
    [x + width, y + height],
    [x, y + height],
  ];
}

function areas(pieces: readonly Parts[]): number[] {
  return pieces.map((piece) => Number(footprintArea(piece).toFixed(2)));
}

function line(...places: [number, number][]) {
  return places.map(([east, north]) => [E + east, N + north] as const);
}

describe('splitPreview', () => {
  const house: Parts = [[box(0, 0, 10, 8)]];
  const court: Parts = [[box(0, 0, 10, 10), box(4, 4, 2, 2)]];

  it.each([
    ['straight through', house, line([3, -1], [3, 9]), [56, 24]],
    ['with a bend', house, line([3, -1], [3, 4], [11, 4]), [52, 28]],
    ['beside it', house, line([20, -1], [20, 9]), []],
    ['not all through', house, line([3, -1], [3, 5]), []],
    ['through a courtyard', court, line([5, -1], [5, 11]), [48, 48]],
    ['one point', house, line([3, -1]), []],
    ['nothing', [], line([3, -1], [3, 9]), []],
  ])('a line %s', (_name, parts, along, expected) => {
    expect(areas(splitPreview(parts, along))).toEqual(expected);
  });

  it('leaves parts that the line does not meet with the largest piece', () => {
    const two: Parts = [[box(0, 0, 10, 8)], [box(30, 0, 5, 5)]];
    expect(areas(splitPreview(two, line([3, -1], [3, 9])))).toEqual([81, 24]);
  });
});

describe('splitLine', () => {
  it('goes straight on at both ends', () => {
    expect(splitLine(line([3, 0], [3, 4], [10, 4]))).toEqual(line([3, -0.25], [3, 4], [10.25, 4]));
    expect(splitLine(line([3, 0]))).toEqual(line([3, 0]));
  });
});
