import { describe, expect, it } from 'vitest';
import { footprintArea, partArea } from '../../../shared/building/footprint-area.ts';
import { footprintMiddle } from '../../../shared/building/footprint-middle.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';

const [E, N] = [500_000, 6_080_000];

function box(x: number, y: number, width: number, depth: number): PlanPoint[] {
  return [[E + x, N + y], [E + x + width, N + y], [E + x + width, N + y + depth], [E + x, N + y + depth]]; // prettier-ignore
}

describe('the area of a footprint', () => {
  it('is that of its parts less their holes, however rings run', () => {
    const courtyard = [box(0, 0, 40, 30), box(10, 10, 10, 5)];
    expect(partArea(courtyard)).toBe(1150);
    expect(partArea(courtyard.map((ring) => [...ring].reverse()))).toBe(1150);
    expect(footprintArea([courtyard, [box(100, 0, 2, 3)]])).toBe(1156);
    expect(footprintArea([])).toBe(0);
  });
});

describe('the middle of a footprint', () => {
  it('is the centre of area of its largest part', () => {
    expect(footprintMiddle([[box(100, 0, 2, 2)], [box(0, 0, 40, 30)]])).toEqual([E + 20, N + 15]);
  });

  it('moves away from a hole', () => {
    const [x, y] = footprintMiddle([[box(0, 0, 40, 10), box(20, 0, 20, 10).reverse()]]);
    expect([x - E, y - N]).toEqual([10, 5]);
  });

  it('of no area is a corner of it', () => {
    expect(footprintMiddle([[box(3, 4, 10, 0)]])).toEqual([E + 3, N + 4]);
  });
});
