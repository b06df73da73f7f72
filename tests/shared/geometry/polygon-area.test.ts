import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { polygonArea } from '../../../shared/geometry/polygon-area.ts';
import { regularRing, rings } from '../../support/drawn-geometry.ts';
import { FAR_FROM_ORIGIN, motions, movePoint } from '../../support/plan-motion.ts';
import { holds } from '../../support/property.ts';

const rectangle: PlanPoint[] = [
  [0, 0],
  [5, 0],
  [5, 3],
  [0, 3],
];

describe('polygonArea', () => {
  it('of a rectangle', () => {
    expect(polygonArea(rectangle)).toBe(15);
  });

  it('is negative clockwise', () => {
    expect(polygonArea([...rectangle].reverse())).toBe(-15);
  });

  it('is the same where the ring repeats its first vertex', () => {
    expect(polygonArea([...rectangle, [0, 0]])).toBe(15);
  });

  it('of an L is that of its two parts', () => {
    expect(polygonArea([[0, 0], [6, 0], [6, 2], [2, 2], [2, 5], [0, 5]])).toBe(18); // prettier-ignore
  });

  it('of fewer than three vertices is 0', () => {
    expect(polygonArea([])).toBe(0);
    expect(polygonArea([[1, 2]])).toBe(0);
    expect(polygonArea([[1, 2], [3, 4]])).toBe(0); // prettier-ignore
  });

  it('of a bow tie is what turns left less what turns right', () => {
    expect(polygonArea([[0, 0], [2, 2], [2, 0], [0, 2]])).toBe(0); // prettier-ignore
  });

  it('of a regular ring is n/2 r² sin(2π/n)', () => {
    for (const n of [3, 4, 6, 100]) {
      const wanted = (n / 2) * 400 * Math.sin((2 * Math.PI) / n);
      expect(polygonArea(regularRing(n, 20))).toBeCloseTo(wanted, 10);
    }
  });

  it('keeps a square millimetre in a national grid', () => {
    // without the shift to the first vertex, products of 3e12 would lose 5e-4 m² each
    const [east, north] = [500_000, 6_000_000];
    const tiny = rectangle.map(([x, y]): PlanPoint => [east + x / 1024, north + y / 1024]);
    expect(polygonArea(tiny)).toBe(15 / 1024 / 1024);
  });

  it('does not change when the ring moves', () => {
    holds(fc.tuple(rings, motions), ([ring, motion]) => {
      const moved = polygonArea(ring.map((vertex) => movePoint(motion, vertex)));
      // twelve vertices, each off by so much across 60 m
      expect(Math.abs(moved - polygonArea(ring))).toBeLessThan(12 * 60 * FAR_FROM_ORIGIN);
    });
  });

  it('does not depend on the first vertex', () => {
    holds(rings, (ring) => {
      const [first, ...rest] = ring;
      if (first === undefined) throw new Error('a ring has vertices');
      expect(polygonArea([...rest, first])).toBeCloseTo(polygonArea(ring), 10);
    });
  });

  it('turns its sign with the ring', () => {
    holds(rings, (ring) => {
      expect(polygonArea([...ring].reverse())).toBeCloseTo(-polygonArea(ring), 10);
    });
  });
});
