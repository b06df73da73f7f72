import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { mergeEdges } from '../../../shared/geometry/merge-edges.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { PlanPoint, Segment } from '../../../shared/geometry/point.ts';
import { polygonEdges } from '../../../shared/geometry/polygon-edges.ts';
import { regularRing, rings } from '../../support/drawn-geometry.ts';
import { FAR_FROM_ORIGIN, motions, movePoint, moveSegment } from '../../support/plan-motion.ts';
import { holds } from '../../support/property.ts';
import { keepsTo } from '../../support/straightness.ts';

const TOLERANCE = { angle: Math.PI / 36, offset: 0.2 };

const house: PlanPoint[] = [[0, 0], [10, 0], [10, 6], [0, 6]]; // prettier-ignore

function merged(ring: readonly PlanPoint[]): Segment[] {
  return mergeEdges(polygonEdges(ring), TOLERANCE);
}

function startedAt<Item>(items: readonly Item[], first: number): Item[] {
  return [...items.slice(first), ...items.slice(0, first)];
}

function keys(edges: readonly Segment[]): string[] {
  return edges.map(({ start, end }) => JSON.stringify([start, end])).sort();
}

/** A ring with each of its edges cut into a few, their joints a little off the line. */
const roughRings = fc
  .tuple(rings, fc.array(fc.integer({ min: 1, max: 3 }), { minLength: 12, maxLength: 12 }))
  .map(([ring, cuts]) =>
    polygonEdges(ring).flatMap(({ start, end }, k): PlanPoint[] => {
      const parts = cuts[k % 12] ?? 1;
      const length = planDistance(start, end);
      const off = Math.min(0.05, length / 200);
      return Array.from({ length: parts }, (_, part): PlanPoint => {
        const share = part / parts;
        const bulge = part === 0 ? 0 : (off * (part % 2 === 0 ? -1 : 1)) / length;
        return [
          start[0] + share * (end[0] - start[0]) - bulge * (end[1] - start[1]),
          start[1] + share * (end[1] - start[1]) + bulge * (end[0] - start[0]),
        ];
      });
    }),
  );

describe('mergeEdges', () => {
  it('leaves corners as they are, in order', () => {
    expect(merged(house)).toEqual(polygonEdges(house));
  });

  it('joins the two halves of a wall', () => {
    expect(merged([[0, 0], [5, 0.05], [10, 0], [10, 6], [0, 6]])).toEqual(polygonEdges(house)); // prettier-ignore
  });

  it('joins across the starting vertex, which comes last then', () => {
    const edges = merged([[5, 0.05], [10, 0], [10, 6], [0, 6], [0, 0]]); // prettier-ignore
    expect(edges).toEqual(startedAt(polygonEdges(house), 1));
  });

  it('drops edges of no length', () => {
    const edges = [{ start: [0, 0], end: [0, 0] } as const, ...polygonEdges(house)];
    expect(mergeEdges(edges, TOLERANCE)).toEqual(polygonEdges(house));
  });

  it('of nothing is nothing', () => {
    expect(mergeEdges([], TOLERANCE)).toEqual([]);
  });

  it('keeps a jog that turns too far, however short', () => {
    const jogged: PlanPoint[] = [[0, 0], [5, 0], [5, 0.1], [10, 0.1], [10, 6], [0, 6]]; // prettier-ignore
    expect(merged(jogged)).toHaveLength(6);
  });

  it('keeps a bend that leaves the line by more than the offset', () => {
    expect(merged([[0, 0], [10, -0.3], [20, 0], [20, 6], [0, 6]])).toHaveLength(5); // prettier-ignore
    expect(merged([[0, 0], [10, -0.1], [20, 0], [20, 6], [0, 6]])).toHaveLength(4); // prettier-ignore
  });

  it('does not collapse a near-circle: each edge takes ten degrees of its turn at most', () => {
    for (const corners of [36, 72, 180, 720]) {
      const edges = mergeEdges(polygonEdges(regularRing(corners, 20)), {
        angle: Math.PI / 36,
        offset: 5,
      });
      expect(edges.length).toBeGreaterThanOrEqual(36 * (corners / (corners + 36)));
      expect(edges.length).toBeLessThanOrEqual(72);
      // the perimeter of a 32-gon is 0.16 % short of the circle
      const perimeter = edges.reduce((sum, { start, end }) => sum + planDistance(start, end), 0);
      expect(perimeter / (2 * Math.PI * 20)).toBeGreaterThan(0.995);
    }
  });

  it('does not collapse a sliver', () => {
    expect(merged([[0, 0], [10, 0], [5, 0.05]])).toHaveLength(2); // prettier-ignore
    expect(merged([[0, 0], [10, 0]])).toHaveLength(2); // prettier-ignore
  });

  it('keeps to its tolerance, and its edges follow one another and close', () => {
    holds(roughRings, (ring) => {
      const edges = merged(ring);
      const fine = polygonEdges(ring);
      for (const [k, { start, end }] of edges.entries()) {
        const next = edges[k + 1] ?? edges[0];
        expect(end).toEqual(next?.start);
        const first = fine.findIndex((edge) => edge.start === start);
        const turned = startedAt(fine, first);
        const last = turned.findIndex((edge) => edge.end === end);
        expect(keepsTo(turned.slice(0, last + 1), TOLERANCE)).toBe(true);
      }
    });
  });

  it('does not depend on the starting vertex', () => {
    holds(fc.tuple(roughRings, fc.nat(40)), ([ring, start]) => {
      const other = startedAt(ring, start % ring.length);
      expect(keys(merged(other))).toEqual(keys(merged(ring)));
    });
  });

  it('does not depend on the starting vertex of a near-circle', () => {
    const ring = regularRing(90, 25);
    for (let start = 1; start < 90; start++) {
      expect(keys(merged(startedAt(ring, start)))).toEqual(keys(merged(ring)));
    }
  });

  it('begins with the first run at or after the starting vertex', () => {
    holds(roughRings, (ring) => {
      const order = merged(ring).map(({ start }) => ring.indexOf(start));
      expect([...order].sort((a, b) => a - b)).toEqual(order);
    });
  });

  it('moves with the ring', () => {
    holds(fc.tuple(roughRings, motions), ([ring, motion]) => {
      const there = merged(ring.map((vertex) => movePoint(motion, vertex)));
      const here = merged(ring).map((edge) => moveSegment(motion, edge));
      expect(there).toHaveLength(here.length);
      for (const [k, { start, end }] of here.entries()) {
        expect(planDistance(there[k]?.start ?? [NaN, NaN], start)).toBeLessThan(FAR_FROM_ORIGIN);
        expect(planDistance(there[k]?.end ?? [NaN, NaN], end)).toBeLessThan(FAR_FROM_ORIGIN);
      }
    });
  });

  it('of what is merged is the same again, where corners are sharp', () => {
    const once = merged([[0, 0], [5, 0.05], [10, 0], [10.05, 3], [10, 6], [4, 5.95], [0, 6]]); // prettier-ignore
    expect(mergeEdges(once, TOLERANCE)).toEqual(once);
  });

  it('looks past a jog no longer than it may be, whatever way it points', () => {
    const jogged: PlanPoint[] = [
      [0, 0],
      [10, 0],
      [10, 0.05],
      [20, 0.05],
      [20, 8],
      [0, 8],
    ];
    const tolerance = { angle: Math.PI / 36, offset: 0.2 };
    expect(mergeEdges(polygonEdges(jogged), tolerance)).toHaveLength(6);
    expect(mergeEdges(polygonEdges(jogged), { ...tolerance, jog: 0.1 })).toHaveLength(4);
  });
});
