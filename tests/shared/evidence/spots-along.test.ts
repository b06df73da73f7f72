import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Spot } from '../../../shared/evidence/marks.ts';
import { spotsAlong } from '../../../shared/evidence/spots-along.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import { holds, numbers } from '../../support/property.ts';

/** A line as contours are: many short parts that turn a little. */
const contours = fc
  .tuple(
    numbers(-Math.PI, Math.PI),
    fc.array(fc.tuple(numbers(-0.25, 0.25), numbers(2, 12)), { minLength: 3, maxLength: 40 }),
  )
  .map(([start, parts]) => {
    let [x, y, heading] = [0, 0, start];
    const line: Spot[] = [[x, y]];
    for (const [turn, length] of parts) {
      heading += turn;
      [x, y] = [x + length * Math.cos(heading), y + length * Math.sin(heading)];
      line.push([x, y]);
    }
    return line;
  });
const sizes = numbers(6, 30).map((wide) => ({ wide, tall: 3 }));

/** The place on a line after so much of it. */
function stationOn(line: readonly Spot[], distance: number): Spot {
  let left = distance;
  for (const [k, to] of line.entries()) {
    const from = line[k - 1];
    if (from === undefined) continue;
    const long = planDistance(from, to);
    if (left <= long || k === line.length - 1) {
      const share = left / long;
      return [from[0] + share * (to[0] - from[0]), from[1] + share * (to[1] - from[1])];
    }
    left -= long;
  }
  return [NaN, NaN];
}

describe('spotsAlong', () => {
  it('never has words upside down', () => {
    holds(fc.tuple(contours, sizes), ([line, size]) => {
      for (const {
        box: {
          along: [c, s],
        },
      } of spotsAlong(line, size)) {
        // prettier-ignore
        expect(Math.hypot(c, s)).toBeCloseTo(1, 9);
        expect(c > -1e-9 && !(Math.abs(c) <= 1e-9 && s > 0)).toBe(true);
      }
    });
  });

  it.each([
    ['up the sheet', [[0, 100], [0, 0]]],
    ['down the sheet', [[0, 0], [0, 100]]],
  ] as const)('runs words of a line %s up it', (_, line) => {
    const spots = spotsAlong(line, { wide: 12, tall: 3 });
    expect(spots.length).toBeGreaterThan(10);
    for (const { box } of spots) {
      expect(box.along[0]).toBeCloseTo(0, 9);
      expect(box.along[1]).toBe(-1);
    }
  }); // prettier-ignore

  it('has its middle on the line, which is at most 0.7 mm off all along the words', () => {
    holds(fc.tuple(contours, sizes), ([line, size]) => {
      for (const { box, distance } of spotsAlong(line, size)) {
        const { middle, along: [c, s], halfWide } = box; // prettier-ignore
        const [x, y] = middle;
        expect(planDistance(stationOn(line, distance), middle)).toBeLessThan(1e-6);
        for (let off = -halfWide; off <= halfWide; off += 0.25) {
          const [a, b] = stationOn(line, distance + off);
          expect(Math.abs((b - y) * c - (a - x) * s)).toBeLessThan(0.7 + 1e-9);
        }
      }
    });
  });

  it('has none where the line bends to one side and back', () => {
    const bow: Spot[] = [[0, 0], [5, 0], [7.5, 2], [10, 0], [12.5, -2], [15, 0], [20, 0]]; // prettier-ignore
    expect(spotsAlong(bow, { wide: 18, tall: 3 })).toEqual([]);
  });

  it('has spots all along a straight line but at its ends', () => {
    const spots = spotsAlong([[0, 0], [100, 0]], { wide: 16, tall: 3 }); // prettier-ignore
    const middles = spots.map(({ box }) => box.middle[0]);
    for (const { box, distance } of spots) expect(box.middle[0]).toBeCloseTo(distance, 9);
    for (const x of middles) expect(x >= 8 && x <= 92).toBe(true);
    expect(spots.length).toBeGreaterThanOrEqual(20);
  });

  it('has none where the line bends, or is shorter than the words', () => {
    const bent: Spot[] = [[0, 0], [15, 0], [15, 15]]; // prettier-ignore
    expect(spotsAlong(bent, { wide: 24, tall: 3 })).toEqual([]);
    expect(spotsAlong([[0, 0], [15, 0]], { wide: 20, tall: 3 })).toEqual([]); // prettier-ignore
  });
});
