import { describe, expect, it } from 'vitest';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { polygonEdges } from '../../../shared/geometry/polygon-edges.ts';
import { rings } from '../../support/drawn-geometry.ts';
import { holds } from '../../support/property.ts';

const triangle: PlanPoint[] = [
  [0, 0],
  [4, 0],
  [4, 3],
];

describe('polygonEdges', () => {
  it('go round and back to the first vertex', () => {
    expect(polygonEdges(triangle)).toEqual([
      { start: [0, 0], end: [4, 0] },
      { start: [4, 0], end: [4, 3] },
      { start: [4, 3], end: [0, 0] },
    ]);
  });

  it('are the same where the ring repeats its first vertex', () => {
    expect(polygonEdges([...triangle, [0, 0]])).toEqual(polygonEdges(triangle));
  });

  it('leave out repeated vertices, wherever they are', () => {
    const repeated: PlanPoint[] = [[0, 0], [0, 0], [4, 0], [4, 3], [4, 3], [4, 3], [0, 0], [0, 0]]; // prettier-ignore
    expect(polygonEdges(repeated)).toEqual(polygonEdges(triangle));
  });

  it('of one place or none are none', () => {
    expect(polygonEdges([])).toEqual([]);
    expect(polygonEdges([[1, 1]])).toEqual([]);
    expect(polygonEdges([[1, 1], [1, 1]])).toEqual([]); // prettier-ignore
  });

  it('of two places go there and back', () => {
    expect(polygonEdges([[0, 0], [1, 0]])).toEqual([
      { start: [0, 0], end: [1, 0] },
      { start: [1, 0], end: [0, 0] },
    ]); // prettier-ignore
  });

  it('follow one another and close', () => {
    holds(rings, (ring) => {
      const edges = polygonEdges(ring);
      expect(edges).toHaveLength(ring.length);
      for (const [k, { end }] of edges.entries()) {
        const next = edges[k + 1] ?? edges[0];
        expect(planDistance(end, next?.start ?? [NaN, NaN])).toBe(0);
      }
    });
  });
});
