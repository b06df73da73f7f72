import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { BuildingWalls } from '../../../shared/building/facade.ts';
import { rows, type Row } from '../../../shared/building/rows.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { PlanPoint, Segment } from '../../../shared/geometry/point.ts';
import { FAR_FROM_ORIGIN, motions, movePoint, moveSegment } from '../../support/plan-motion.ts';
import { holds, numbers } from '../../support/property.ts';
import { keepsTo } from '../../support/straightness.ts';
import { arcPoints, building, house, houseName, terrace, wallOf } from '../../support/terraces.ts';

const TOLERANCE = { angle: Math.PI / 36, offset: 0.5 };
const DEGREE = Math.PI / 180;

/** The members of each row, as short words: building and wall. */
function members(found: readonly Row[]): string[] {
  return found.map((row) =>
    row.members.map(({ buildingId, wallIndex }) => `${buildingId}${wallIndex}`).join(' '),
  );
}

/** Odd steps from −max to max: so that none lies on a limit, where rounding would decide. */
function strays(max: number): fc.Arbitrary<number> {
  return fc.integer({ min: -33, max: 33 }).map((steps) => (steps * max) / 33.17);
}

/** A terrace of four to ten houses whose fronts and backs stray from their lines. */
const strayTerraces = fc
  .array(fc.tuple(strays(1.5), strays(0.5), strays(0.5)), { minLength: 5, maxLength: 11 })
  .map((steps) => {
    let x = 0;
    const fronts: PlanPoint[] = [];
    const backs: PlanPoint[] = [];
    for (const [width, front, back] of steps) {
      fronts.push([x, front]);
      backs.push([x, 8 + back]);
      x += 5.5 + width;
    }
    return terrace(fronts, backs);
  });

describe('rows of houses by hand', () => {
  it('of nothing, or of one house, are none', () => {
    expect(rows([])).toEqual([]);
    expect(rows([house('a', 0, 0)])).toEqual([]);
    expect(rows([{ id: 'a', walls: [] }])).toEqual([]);
  });

  it('of a terrace are its front and its back', () => {
    const found = rows([house('a', 0, 0), house('b', 5, 0), house('c', 10, 0)]);
    expect(members(found)).toEqual(['a0 b0 c0', 'a2 b2 c2']);
    expect(found.map(({ segment }) => segment)).toEqual([
      { start: [0, 0], end: [15, 0] },
      { start: [0, 8], end: [15, 8] },
    ]);
  });

  it('has no back row where the houses are of unlike depth', () => {
    const found = rows([house('a', 0, 0, 5, 8), house('b', 5, 0, 5, 10), house('c', 10, 0)]);
    expect(members(found)).toEqual(['a0 b0 c0']);
  });

  it('takes a step of 0.4 m, not of 0.6 m', () => {
    expect(members(rows([house('a', 0, 0), house('b', 5, 0.4)]))).toEqual(['a0 b0', 'a2 b2']);
    expect(rows([house('a', 0, 0), house('b', 5, 0.6)])).toEqual([]);
  });

  it('takes a gap of 0.4 m, not of 0.6 m', () => {
    expect(members(rows([house('a', 0, 0), house('b', 5.4, 0)]))).toEqual(['a0 b0', 'a2 b2']);
    expect(rows([house('a', 0, 0), house('b', 5.6, 0)])).toEqual([]);
  });

  it('is cut where one house stands back', () => {
    const street = [0, 1, 2, 3, 4].map((k) => house(houseName(k), 5 * k, k === 2 ? 2 : 0));
    const fronts = rows(street).filter(({ segment }) => segment.start[1] === 0);
    expect(fronts.map(({ segment }) => segment.end[0])).toEqual([10, 25]);
  });

  it('goes round a corner as two rows, the corner house in both', () => {
    const found = rows([house('a', 0, 0, 5, 5), house('b', 5, 0, 5, 5), house('c', 5, 5, 5, 5)]);
    // walls that stand against another house take part as well: a2 and b2 are one line, b3 and c3
    expect(members(found)).toEqual(['a0 b0', 'a2 b2', 'b1 c1', 'b3 c3']);
  });

  it('does not join houses that only touch at a corner', () => {
    expect(rows([house('a', 0, 0), house('b', 5, 8)])).toEqual([]);
  });

  it('does not join facing party walls of one joint', () => {
    for (const { members: of } of rows([house('a', 0, 0), house('b', 5, 0)])) {
      expect(of.map(({ wallIndex }) => wallIndex)).not.toContain(1);
      expect(of.map(({ wallIndex }) => wallIndex)).not.toContain(3);
    }
  });

  it('takes a front in two walls as two members', () => {
    const ring: PlanPoint[] = [[5, 0], [8, 0], [8, 0.3], [11, 0.3], [11, 8], [5, 8]]; // prettier-ignore
    expect(members(rows([house('a', 0, 0), building('b', ring)]))).toEqual(['a0 b0 b2', 'a2 b4']);
  });

  it('takes houses drawn the other way round', () => {
    const other = building('b', [[5, 8], [10, 8], [10, 0], [5, 0]]); // prettier-ignore
    const found = rows([house('a', 0, 0), other, house('c', 10, 0)]);
    expect(members(found)).toEqual(['a0 b2 c0', 'a2 b0 c2']);
  });

  it('passes over walls of no length and keeps the places of the others', () => {
    const [front, ...others] = house('b', 5, 0).walls;
    if (front === undefined) throw new Error('a house has walls');
    const nothing: Segment = { start: [5, 0], end: [5, 0] };
    const found = rows([house('a', 0, 0), { id: 'b', walls: [nothing, front, ...others] }]);
    expect(members(found)).toEqual(['a0 b1', 'a2 b3']);
  });

  it('obeys its tolerance', () => {
    const street = [house('a', 0, 0), house('b', 5.6, 0)];
    const wide = { angle: Math.PI / 36, offset: 0.7, overlap: 0.5 };
    expect(members(rows(street, wide))).toEqual(['a0 b0', 'a2 b2']);
    expect(rows(street, { ...wide, overlap: 9 })).toEqual([]);
  });
});

describe('rows of curved terraces', () => {
  it('overlap: each house is in the longest straight rows about it', () => {
    // a turn of 2.5 degrees between fronts of 5 m: four are 0.44 m off their line, five 0.68
    const radius = 2.5 / Math.sin(1.25 * DEGREE);
    const houses = terrace(arcPoints(9, radius, 2.5 * DEGREE), arcPoints(9, 1.2 * radius, 2.5 * DEGREE)); // prettier-ignore
    const fronts = rows(houses).filter(({ members: [first] }) => first?.wallIndex === 0);
    expect(fronts.map((row) => row.members.map(({ buildingId }) => Number(buildingId.slice(6))))) // prettier-ignore
      .toEqual([
        [0, 1, 2, 3],
        [1, 2, 3, 4],
        [2, 3, 4, 5],
        [3, 4, 5, 6],
        [4, 5, 6, 7],
      ]);
  });

  it('go all round a circus, across where it starts', () => {
    const points = arcPoints(144, 114.6, 2.5 * DEGREE);
    const backs = points.map(([x, y]): PlanPoint => [1.3 * x, 1.3 * y]);
    const [first, firstBack] = [points[0], backs[0]];
    if (first === undefined || firstBack === undefined) throw new Error('a circus has houses');
    const fronts = rows(terrace([...points, first], [...backs, firstBack])).filter(
      ({ members: [one] }) => one?.wallIndex === 0,
    );
    expect(fronts).toHaveLength(144);
    expect(new Set(fronts.map((row) => row.members.length))).toEqual(new Set([4]));
  });

  it('are not swallowed by drift: no member turns more than 5 degrees from its row', () => {
    holds(fc.tuple(numbers(0.1, 6), numbers(20, 60)), ([turn, count]) => {
      const radius = 2.5 / Math.sin((turn / 2) * DEGREE);
      const points = Math.min(Math.round(count), Math.floor(300 / turn));
      const houses = terrace(
        arcPoints(points, radius, turn * DEGREE),
        arcPoints(points, radius + 8, turn * DEGREE),
      );
      for (const row of rows(houses)) {
        const along = turnedAlong(row, houses);
        expect(keepsTo(along, TOLERANCE)).toBe(true);
      }
    });
  });
});

/** The walls of a row, each read in the direction of the row. */
function turnedAlong({ segment, members: of }: Row, houses: readonly BuildingWalls[]): Segment[] {
  const [dx, dy] = [segment.end[0] - segment.start[0], segment.end[1] - segment.start[1]];
  return of.map((member) => {
    const { start, end } = wallOf(houses, member);
    const forwards = (end[0] - start[0]) * dx + (end[1] - start[1]) * dy > 0;
    return forwards ? { start, end } : { start: end, end: start };
  });
}

describe('rows of any terrace', () => {
  it('run from end to end of their members, which follow one another and keep to the line', () => {
    holds(strayTerraces, (houses) => {
      for (const row of rows(houses)) {
        const along = turnedAlong(row, houses);
        expect(along[0]?.start).toEqual(row.segment.start);
        expect(along.at(-1)?.end).toEqual(row.segment.end);
        expect(keepsTo(along, TOLERANCE)).toBe(true);
        expect(new Set(row.members.map(({ buildingId }) => buildingId)).size).toBeGreaterThan(1);
        for (const [k, { end }] of along.slice(0, -1).entries()) {
          const next = along[k + 1]?.start ?? [NaN, NaN];
          expect(planDistance(end, next)).toBeLessThanOrEqual(0.5);
        }
      }
    });
  });

  it('are every longest run of fronts that keeps to the line', () => {
    holds(strayTerraces, (houses) => {
      const fronts = houses.flatMap(({ walls }) => walls.slice(0, 1));
      const straight = fronts.flatMap((_, from) =>
        fronts.flatMap((__, to) => {
          const run = fronts.slice(from, to + 1);
          return to > from && keepsTo(run, TOLERANCE) ? [[from, to] as const] : [];
        }),
      );
      const longest = straight.filter(
        ([from, to]) => !straight.some(([a, b]) => a <= from && b >= to && b - a > to - from),
      );
      const found = rows(houses)
        .filter(({ members: [first] }) => first?.wallIndex === 0)
        .map(({ members: of }) => of.map(({ buildingId }) => Number(buildingId.slice(6))))
        .map((of) => [of[0], of.at(-1)]);
      expect(found).toEqual(longest);
    });
  });

  it('do not depend on the order of the houses', () => {
    const shuffles = fc.array(fc.nat(), { minLength: 11, maxLength: 11 });
    holds(fc.tuple(strayTerraces, shuffles), ([houses, keys]) => {
      const shuffled = houses
        .map((one, k) => ({ one, key: keys[k] ?? 0 }))
        .sort((a, b) => a.key - b.key)
        .map(({ one }) => one);
      expect(rows(shuffled)).toEqual(rows(houses));
    });
  });

  it('do not depend on the order of houses that have equal claims', () => {
    const party: Segment = { start: [5, 0], end: [5, 8] };
    const left = { id: 'b', walls: [party, { start: [5.2, 0.2], end: [10, 0.2] } as const] };
    const right = { id: 'c', walls: [party, { start: [5.2, -0.2], end: [10, -0.2] } as const] };
    const a = house('a', 0, 0);
    const wanted = members(rows([a, left, right]));
    expect(wanted).toContain('a0 b1');
    expect(members(rows([right, left, a]))).toEqual(wanted);
    expect(members(rows([right, a, left]))).toEqual(wanted);
  });

  it('move with the houses, to a national grid too', () => {
    holds(fc.tuple(strayTerraces, motions), ([houses, motion]) => {
      const moved = houses.map(({ id, walls }) => ({
        id,
        walls: walls.map((wall) => moveSegment(motion, wall)),
      }));
      const [here, there] = [rows(houses), rows(moved)];
      expect(members(there)).toEqual(members(here));
      for (const [k, { segment }] of here.entries()) {
        const off = planDistance(
          there[k]?.segment.start ?? [NaN, NaN],
          movePoint(motion, segment.start),
        );
        expect(off).toBeLessThan(FAR_FROM_ORIGIN);
      }
    });
  });

  it('do not depend on how each house is drawn', () => {
    holds(strayTerraces, (houses) => {
      const redrawn = houses.map(({ id, walls }) => ({
        id,
        walls: walls.map(({ start, end }) => ({ start: end, end: start })),
      }));
      expect(rows(redrawn)).toEqual(rows(houses));
    });
  });

  it('of twenty streets of a hundred houses are forty', () => {
    const town = Array.from({ length: 2000 }, (_, k) =>
      house(houseName(k), 500_000 + 5 * (k % 100), 6_000_000 + 40 * Math.floor(k / 100)),
    );
    const found = rows(town);
    expect(found).toHaveLength(40);
    for (const { members: of, segment } of found) {
      expect(of).toHaveLength(100);
      expect(planDistance(segment.start, segment.end)).toBe(500);
    }
  });
});
