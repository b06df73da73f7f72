import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gridInPolygon } from '../../../shared/geometry/grid-in-polygon.ts';
import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import { pointInPolygon } from '../../../shared/geometry/point-in-polygon.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { polygonEdges } from '../../../shared/geometry/polygon-edges.ts';
import { at } from '../../../shared/numerics/at.ts';
import { regularRing, rings } from '../../support/drawn-geometry.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { FAR_FROM_ORIGIN, motions, movePoint } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';

const rectangle: PlanPoint[] = [[0, 0], [10, 0], [10, 6], [0, 6]]; // prettier-ignore
const court: PlanPoint[] = [[3, 2], [7, 2], [7, 4], [3, 4]]; // prettier-ignore
const ell: PlanPoint[] = [[0, 0], [8, 0], [8, 2], [2, 2], [2, 6], [0, 6]]; // prettier-ignore
const PLENTY = 100_000;

function pairs(flat: Float64Array): PlanPoint[] {
  return Array.from({ length: flat.length / 2 }, (_, k) => [at(flat, 2 * k), at(flat, 2 * k + 1)]);
}

function grid(of: readonly (readonly PlanPoint[])[], spacing: number): PlanPoint[] {
  return pairs(gridInPolygon(of, spacing, PLENTY));
}

function rounded([x, y]: PlanPoint): string {
  return `${Math.round(x * 1e5)} ${Math.round(y * 1e5)}`;
}

/** Whether two lists hold the same points, to rounding, in any order. */
function expectSamePoints(got: readonly PlanPoint[], wanted: readonly PlanPoint[]): void {
  expect(got).toHaveLength(wanted.length);
  expect(got.map(rounded).sort()).toEqual(wanted.map(rounded).sort());
}

describe('gridInPolygon', () => {
  it('of a rectangle, by hand: corners, edges, then the inside', () => {
    expect(grid([rectangle], 5)).toEqual([
      [0, 0],
      [5, 0],
      [10, 0],
      [10, 3],
      [10, 6],
      [5, 6],
      [0, 6],
      [0, 3],
      [5, 3],
    ]);
  });

  it('of a small polygon is its corners', () => {
    expect(grid([rectangle], 100)).toEqual(rectangle);
  });

  it('takes the edges of holes and leaves out what is in them', () => {
    const points = grid([rectangle, court], 1);
    const inside = points.filter(([x, y]) => x > 3 && x < 7 && y > 2 && y < 4);
    expect(inside).toEqual([]);
    expect(points.filter(([x, y]) => x === 3 && y === 3)).toHaveLength(1);
    // 32 on the outer ring, 12 round the court, 9 · 5 inside less the 5 · 3 of the court
    expect(points).toHaveLength(32 + 12 + 45 - 15);
  });

  it('names no point twice where the grid passes along an inner edge', () => {
    const points = grid([ell], 1);
    expect(new Set(points.map(String)).size).toBe(points.length);
    // 28 on the edge; inside 7 and 3 points
    expect(points).toHaveLength(28 + 7 + 4);
  });

  it('is turned along the longest edge', () => {
    const turned = rectangle.map((p) => movePoint({ turn: 0.3, east: 0, north: 0 }, p));
    const wanted = grid([rectangle], 2).map((p) => movePoint({ turn: 0.3, east: 0, north: 0 }, p));
    expectSamePoints(grid([turned], 2), wanted);
  });

  it('refuses more points than its limit, and takes as many', () => {
    expect(gridInPolygon([rectangle], 5, 9)).toHaveLength(18);
    expect(methodErrorOf(() => gridInPolygon([rectangle], 5, 8)).code).toBe('outside-range');
  });

  it('refuses an enormous grid at once', () => {
    const huge = rectangle.map(([x, y]): PlanPoint => [x * 1e9, y * 1e9]);
    expect(methodErrorOf(() => gridInPolygon([huge], 0.1, 10_000)).code).toBe('outside-range');
  });

  it.each([0, -1, NaN])('refuses a spacing of %d', (spacing) => {
    expect(methodErrorOf(() => gridInPolygon([rectangle], spacing, 9)).code).toBe('outside-range');
  });

  it('refuses a polygon that is one point', () => {
    expect(methodErrorOf(() => grid([[[1, 1], [1, 1]]], 1)).code).toBe('zero-length'); // prettier-ignore
    expect(methodErrorOf(() => grid([], 1)).code).toBe('zero-length');
  });

  it('samples a polygon without area along its edges', () => {
    expect(grid([[[0, 0], [4, 0]]], 2)).toEqual([[0, 0], [2, 0], [4, 0], [2, 0]]); // prettier-ignore
  });

  it('has every corner, and nothing outside', () => {
    holds(fc.tuple(rings, numbers(1, 10)), ([ring, spacing]) => {
      const points = grid([ring], spacing);
      const edges = polygonEdges(ring);
      const outside = points.filter((point) => {
        const off = Math.min(...edges.map((edge) => nearestOnSegment(point, edge).distance));
        return off > 1e-9 && !pointInPolygon(point, [ring]);
      });
      expect(outside).toEqual([]);
      const places = new Set(points.map(String));
      expect(ring.filter((vertex) => !places.has(String(vertex)))).toEqual([]);
    });
  });

  it('leaves no place farther from a point than a cell of it is wide', () => {
    const shares = fc.tuple(numbers(0, 1), numbers(0, 1));
    holds(fc.tuple(rings, numbers(2, 8), shares), ([ring, spacing, [a, b]]) => {
      const [one = [0, 0], other = [0, 0]] = ring;
      // a place between the origin, which every ring goes round, and an edge
      const place: PlanPoint = [
        a * (b * one[0] + (1 - b) * other[0]),
        a * (b * one[1] + (1 - b) * other[1]),
      ];
      fc.pre(pointInPolygon(place, [ring]));
      const nearest = Math.min(...grid([ring], spacing).map((point) => planDistance(point, place)));
      expect(nearest).toBeLessThan(spacing * Math.SQRT2);
    });
  });

  it('moves with the polygon', () => {
    holds(fc.tuple(rings, motions), ([ring, motion]) => {
      const there = grid([ring.map((vertex) => movePoint(motion, vertex))], 3);
      const here = grid([ring], 3);
      expect(there).toHaveLength(here.length);
      const off = here.map((point, k) =>
        planDistance(there[k] ?? [NaN, NaN], movePoint(motion, point)),
      );
      // the direction of an edge of 1 m, over 60 m
      expect(Math.max(...off)).toBeLessThan(60 * FAR_FROM_ORIGIN);
    });
  });

  it('is turned along the first of edges that are equally long, however they round', () => {
    const hexagon = regularRing(6, 10);
    holds(motions, (motion) => {
      const moved = hexagon.map((vertex) => movePoint(motion, vertex));
      const there = grid([moved], 2.3);
      const off = grid([hexagon], 2.3).map((point, k) =>
        planDistance(there[k] ?? [NaN, NaN], movePoint(motion, point)),
      );
      expect(Math.max(...off)).toBeLessThan(10 * FAR_FROM_ORIGIN);
    });
  });

  it('of a rectangle is the same from whichever vertex it is given', () => {
    for (const first of [1, 2, 3]) {
      const other = [...rectangle.slice(first), ...rectangle.slice(0, first)];
      expectSamePoints(grid([other], 1.7), grid([rectangle], 1.7));
    }
  });
});
