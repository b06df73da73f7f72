import { describe, expect, test } from 'vitest';
import { thinnedLine } from '../../../shared/ground/thinned-line.ts';
import type { PointOnLevel } from '../../../shared/ground/trace-level.ts';

function aLine(...vertices: [east: number, north: number, slack: number][]): PointOnLevel[] {
  return vertices.map(([east, north, slack]) => ({ point: [east, north], slack }));
}

describe('a thinned line', () => {
  test('keeps its ends and what stands out by more than its slack', () => {
    const line = aLine([0, 0, 1], [10, 0.9, 1], [20, 0, 1], [30, 3, 1], [40, 0, 1]);
    expect(thinnedLine(line)).toEqual([
      [0, 0],
      [20, 0],
      [30, 3],
      [40, 0],
    ]);
  });

  test('does not lose a vertex with little slack behind one that stands out more', () => {
    const line = aLine([0, 0, 1], [10, 0.2, 0.1], [20, 0.8, 1], [40, 0, 1]);
    expect(thinnedLine(line)).toContainEqual([10, 0.2]);
  });

  test('keeps a closed line closed', () => {
    const square = aLine([0, 0, 1], [5, 0.1, 1], [10, 0, 1], [10, 10, 1], [0, 10, 1], [0, 0, 1]);
    expect(thinnedLine(square)).toEqual([
      [0, 0],
      [10, 0],
      [10, 10],
      [0, 10],
      [0, 0],
    ]);
  });

  test('keeps a vertex without slack unless it lies on the line', () => {
    expect(thinnedLine(aLine([0, 0, 1], [5, 0, 0], [10, 0, 1]))).toHaveLength(2);
    expect(thinnedLine(aLine([0, 0, 1], [5, 1e-9, 0], [10, 0, 1]))).toHaveLength(3);
  });
});
