import { describe, expect, it } from 'vitest';
import { linesWithin } from '../../../../server/documents/sheet/lines-within.ts';
import { sheetPlanFrame } from '../../../../server/documents/sheet/plan-frame-of-sheet.ts';
import { LETTER_RADIUS, letterSpots } from '../../../../server/documents/sheet/plan-letters.ts';
import { aRing } from '../../../support/register-facts.ts';

const BOX = { west: 0, south: 0, east: 10, north: 10 };

describe('lines of a plan', () => {
  it('are cut to the stretches that may be seen, with the corners just outside', () => {
    const line = [[-30, 5], [-20, 5], [5, 5], [20, 5], [30, 5], [30, 20], [5, 20], [5, 8]] as const; // prettier-ignore
    expect(linesWithin(line, BOX)).toEqual([
      [[-20, 5], [5, 5], [20, 5]],
      [[5, 20], [5, 8]],
    ]); // prettier-ignore
    expect(linesWithin([[20, 20], [30, 30]], BOX)).toEqual([]); // prettier-ignore
  });

  it('that pass through without a corner inside are kept', () => {
    expect(linesWithin([[-5, 5], [15, 5]], BOX)).toHaveLength(1); // prettier-ignore
  });
});

describe('the plan of a sheet', () => {
  it.each([
    [8, 500],
    [20, 500],
    [50, 500],
    [300, 2000],
  ])('of a building %s m long has a scale that a ruler has: 1 to %s', (long, denominator) => {
    expect(sheetPlanFrame([[aRing(0, 0, long, 8)]]).denominator).toBe(denominator);
  });

  it('takes the whole width where a building would be too small beside its facts', () => {
    const [small, large] = [20, 50].map((long) => sheetPlanFrame([[aRing(0, 0, long, 8)]]));
    expect(large?.width).toBeGreaterThan(1.5 * (small?.width ?? 0));
  });

  it('keeps the letters of walls apart', () => {
    const walls = [0, 1, 2].map((k) => ({
      segment: { start: [k, 0], end: [k + 1, 0] } as const,
    }));
    const place = ([e, n]: readonly [number, number]) => [4 * e, -4 * n] as const;
    const spots = letterSpots({ place }, walls, [2, 5]);
    for (const [k, { letter }] of spots.entries()) {
      for (const other of spots.slice(k + 1)) {
        const apart = Math.hypot(letter[0] - other.letter[0], letter[1] - other.letter[1]);
        expect(apart).toBeGreaterThanOrEqual(2 * LETTER_RADIUS);
      }
    }
  });
});
