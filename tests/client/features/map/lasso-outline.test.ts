import { describe, expect, it } from 'vitest';
import {
  closedShapes,
  lassoOutline,
  lassoShapes,
} from '../../../../src/features/map/lasso-outline.ts';
import type {
  GridPlace,
  GridProjection,
} from '../../../../src/features/map/place/grid-projection.ts';

/** A degree for a kilometre. */
const BROAD: GridProjection = {
  toGrid: ([east, north]) => [east * 1000, north * 1000],
  toLonLat: ([east, north]) => [east / 1000, north / 1000],
};

/** A circle of teeth that stand out by some metres. */
function toothed(count: number, teeth: number): GridPlace[] {
  return Array.from({ length: count }, (_, k) => {
    const angle = (2 * Math.PI * k) / count;
    const radius = 1000 + (k % 2) * teeth;
    return [radius * Math.cos(angle), radius * Math.sin(angle)];
  });
}

describe('the outline of a lasso', () => {
  it('keeps the corners and leaves out what lies along its sides', () => {
    const drawn: GridPlace[] = [[0, 0], [50, 0.4], [100, 0], [100, 100], [0, 100], [0, 1]]; // prettier-ignore
    expect(lassoOutline(drawn, 2, BROAD)).toEqual([[0, 0], [0.1, 0], [0.1, 0.1], [0, 0.1], [0, 0.001]]); // prettier-ignore
  });

  it('has at most 200 corners, however it was drawn', () => {
    const outline = lassoOutline(toothed(3000, 40), 1, BROAD) ?? [];
    expect(outline.length).toBeLessThanOrEqual(200);
    for (const [east, north] of outline) expect(Math.hypot(east, north)).toBeGreaterThan(0.99);
  });

  it('is none where nothing is inside', () => {
    expect(lassoOutline([], 1, BROAD)).toBeNull();
    expect(lassoOutline([[0, 0], [50, 0.1], [100, 0]], 1, BROAD)).toBeNull(); // prettier-ignore
  });

  it('is written to a tenth of a metre', () => {
    const drawn: GridPlace[] = [[0.123456789, 0], [100, 0], [100, 100]]; // prettier-ignore
    expect(lassoOutline(drawn, 1, BROAD)?.[0]).toEqual([0.000123, 0]);
  });
});

describe('what is seen of a lasso', () => {
  it('is the line to the pointer and where to come back to', () => {
    expect(lassoShapes([], [5, 5])).toEqual([]);
    expect(lassoShapes([[0, 0], [9, 0]], [5, 5])).toEqual([
      { kind: 'line', look: 'outline', places: [[0, 0], [9, 0], [5, 5]] },
      { kind: 'point', look: 'corner', place: [0, 0] },
    ]); // prettier-ignore
  });

  it('is the closed outline afterwards', () => {
    expect(closedShapes(null, BROAD)).toEqual([]);
    expect(closedShapes([[0, 0], [1, 0], [1, 1]], BROAD)).toEqual([
      { kind: 'line', look: 'ghost', places: [[0, 0], [1000, 0], [1000, 1000], [0, 0]] },
    ]); // prettier-ignore
  });
});
