import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boundingBox, boxDistance } from '../../../shared/geometry/bounding-box.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import { planPoints } from '../../support/drawn-geometry.ts';
import { holds } from '../../support/property.ts';

const clouds = fc.array(planPoints, { minLength: 1, maxLength: 6 });

describe('boundingBox', () => {
  it('of one point is that point', () => {
    expect(boundingBox([[3, 4]])).toEqual({ west: 3, south: 4, east: 3, north: 4 });
  });

  it('reaches the outermost points', () => {
    const box = boundingBox([
      [3, 4],
      [-1, 8],
      [2, -5],
    ]);
    expect(box).toEqual({ west: -1, south: -5, east: 3, north: 8 });
  });

  it('holds every point', () => {
    holds(clouds, (points) => {
      const box = boundingBox(points);
      for (const point of points) expect(boxDistance(boundingBox([point]), box)).toBe(0);
    });
  });
});

describe('boxDistance', () => {
  const box = boundingBox([
    [0, 0],
    [2, 2],
  ]);

  it.each([
    ['to the side', [5, 1], 3],
    ['above', [1, 7], 5],
    ['at a corner', [5, 6], 5],
    ['inside', [1, 1], 0],
    ['touching', [2, 2], 0],
  ] as const)('%s', (_, [x, y], expected) => {
    expect(boxDistance(box, boundingBox([[x, y]]))).toBe(expected);
  });

  it('is the same both ways, and never more than that of the nearest points', () => {
    holds(fc.tuple(clouds, clouds), ([a, b]) => {
      const distance = boxDistance(boundingBox(a), boundingBox(b));
      expect(boxDistance(boundingBox(b), boundingBox(a))).toBe(distance);
      for (const p of a) {
        for (const q of b) expect(distance).toBeLessThanOrEqual(planDistance(p, q));
      }
    });
  });
});
