import { describe, expect, it } from 'vitest';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { stretchesInPolygon } from '../../../shared/geometry/stretches-in-polygon.ts';

const SQUARE: PlanPoint[] = [[10, -5], [20, -5], [20, 5], [10, 5], [10, -5]]; // prettier-ignore
const YARD: PlanPoint[] = [[13, -2], [16, -2], [16, 2], [13, 2]]; // prettier-ignore
const EAST = { start: [0, 0], direction: [1, 0], length: 100 } as const;

describe('the stretches of a line inside a polygon', () => {
  it('lie between its outer ring and its holes, in order', () => {
    expect(stretchesInPolygon(EAST, [SQUARE])).toEqual([[10, 20]]);
    expect(stretchesInPolygon(EAST, [SQUARE, YARD])).toEqual([
      [10, 13],
      [16, 20],
    ]);
  });

  it('end where the line does', () => {
    expect(stretchesInPolygon({ ...EAST, length: 15 }, [SQUARE])).toEqual([[10, 15]]);
    expect(stretchesInPolygon({ ...EAST, start: [12, 0] }, [SQUARE])).toEqual([[0, 8]]);
    expect(stretchesInPolygon({ ...EAST, length: 9 }, [SQUARE])).toEqual([]);
  });

  it('meet a corner once, and none where the line passes by', () => {
    const lozenge: PlanPoint[] = [[10, 0], [15, 5], [20, 0], [15, -5]]; // prettier-ignore
    expect(stretchesInPolygon(EAST, [lozenge])).toEqual([[10, 20]]);
    expect(stretchesInPolygon({ ...EAST, start: [0, 6] }, [SQUARE])).toEqual([]);
  });

  it('are as long on a line at an angle as it is there', () => {
    const aslant = {
      start: [0, -15],
      direction: [Math.SQRT1_2, Math.SQRT1_2],
      length: 100,
    } as const;
    const [[from, to] = [NaN, NaN]] = stretchesInPolygon(aslant, [SQUARE]);
    expect(from).toBeCloseTo(10 * Math.SQRT2, 12);
    expect(to).toBeCloseTo(20 * Math.SQRT2, 12);
  });
});
