import { describe, expect, it } from 'vitest';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { levelField, type GroundState } from '../../../shared/ground/level-field.ts';
import { distanceFromPlace, placeOf, placeOfFootprint } from '../../../shared/ground/place.ts';
import { siteOf } from '../../../shared/ground/site.ts';
import { stretchesWithinReach } from '../../../shared/ground/stretches-within-reach.ts';
import { nearestPart } from '../../../shared/ground/nearest-part.ts';
import { aDrive, aModel } from '../../support/builders.ts';

const model = aModel();

function fieldOf(start: PlanPoint, end: PlanPoint, faces: number[] = [], founding = 0) {
  const state: GroundState = { position: 2, faces };
  return levelField(model, siteOf(model, placeOf([{ start, end }], 0, founding)), state);
}

/** The stretches of a line north from (E, −60), 120 m long, within 2.5 i. */
function northwards(E: number, faces: number[] = [], founding = 0): [number, number][] {
  const start: PlanPoint = [E, -60];
  const field = fieldOf(start, [E, 60], faces, founding);
  return stretchesWithinReach(field, { start, direction: [0, 1], length: 120 }, 2.5);
}

describe('stretchesWithinReach', () => {
  it('mair-taylor-burland-1996: 2.5 i on either side, i 10 m at ground level', () => {
    const [stretch, ...more] = northwards(0);
    expect(more).toEqual([]);
    expect(stretch?.[0]).toBeCloseTo(35, 12);
    expect(stretch?.[1]).toBeCloseTo(85, 12);
  });

  it('takes i at the founding level', () => {
    // 10 − 0.325·4 = 8.7 m
    expect(northwards(0, [], -4)[0]?.[0]).toBeCloseTo(60 - 21.75, 12);
  });

  it('reaches round the face as a circle, and not beyond', () => {
    // 15 m ahead of the face: √(25² − 15²) = 20 m
    const [stretch] = northwards(15, [500]);
    expect(stretch?.[0]).toBeCloseTo(40, 12);
    expect(stretch?.[1]).toBeCloseTo(80, 12);
    expect(northwards(25.01, [500])).toEqual([]);
  });
});

describe('nearestPart', () => {
  it('finds the part, its piece and the level of its axis', () => {
    const graded = aModel([
      aDrive({
        axis: [
          [-100, 0, -20],
          [100, 0, -24],
        ],
      }),
    ]);
    const place = placeOf([{ start: [0, 5], end: [10, 5] }], 0, 0);
    const field = levelField(graded, siteOf(graded, place), { position: 2, faces: [] });
    const part = nearestPart(field, graded.pieces[0] ?? [], [50, 5]);
    if (part === undefined) expect.unreachable();
    const [start = NaN, , , , inverse = NaN, share = NaN] = part.numbers;
    const length = share / inverse;
    expect(start).toBeLessThanOrEqual(50);
    expect(start + length).toBeGreaterThanOrEqual(50);
    expect(part.axis).toBeCloseTo(-20 - (4 * (start + length / 2 + 100)) / 200, 10);
    expect(1 / inverse).toBeCloseTo(-0.5 * part.axis, 10);
  });

  it('there is none where nothing is packed', () => {
    expect(
      nearestPart(fieldOf([0, 0], [1, 0], [0]), model.pieces[0] ?? [], [0, 0]),
    ).toBeUndefined();
  });
});

describe('distanceFromPlace', () => {
  const drive = { start: [0, 0], end: [100, 0] } as const;
  const ring: PlanPoint[] = [
    [40, -10],
    [60, -10],
    [60, 10],
    [40, 10],
  ];

  it('is to the nearest line of a place', () => {
    const lines = [
      { start: [10, 7], end: [20, 9] },
      { start: [110, 0], end: [120, 0] },
    ] as const;
    expect(distanceFromPlace(placeOf(lines, 0, 0), drive)).toBe(7);
    expect(distanceFromPlace(placeOf(lines.slice(1), 0, 0), drive)).toBe(10);
  });

  it('is nothing for a line that crosses a footprint or lies inside it', () => {
    const place = placeOfFootprint([ring], 0, 0);
    expect(distanceFromPlace(place, drive)).toBe(0);
    expect(distanceFromPlace(place, { start: [45, 0], end: [55, 0] })).toBe(0);
    expect(distanceFromPlace(place, { start: [45, 12], end: [55, 12] })).toBe(2);
  });
});
