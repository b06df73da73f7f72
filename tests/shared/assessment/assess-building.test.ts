import { describe, expect, test } from 'vitest';
import { assessBuilding } from '../../../shared/assessment/assess-building.ts';
import { assessWall } from '../../../shared/assessment/assess-wall.ts';
import { ALL_COMPLETE } from '../../../shared/assessment/moment.ts';
import { joinedWalls, rowsByBuilding } from '../../../shared/building/joined-walls.ts';
import { rows } from '../../../shared/building/rows.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel, aWall, someRules } from '../../support/builders.ts';
import { terrace } from '../../support/terraces.ts';

const RULES = someRules();

/** Houses 5 m wide in a row square to the drive, from y = 2 to 42. */
const FRONTS = Array.from({ length: 9 }, (_, k): PlanPoint => [0, 2 + 5 * k]);
const HOUSES = terrace(
  FRONTS,
  FRONTS.map(([x, y]): PlanPoint => [x - 8, y]),
);
const ROWS = rowsByBuilding(rows(HOUSES));

function wallsOf(id: string) {
  const house = HOUSES.find((found) => found.id === id);
  return (house?.walls ?? []).map((segment, index) =>
    aWall({ name: `wall ${index}`, from: segment.start, to: segment.end, height: 5 }),
  );
}

function assessHouse(id: string, joined: boolean) {
  const walls = wallsOf(id);
  const ofRow = joined ? joinedWalls(id, walls, ROWS) : [];
  const model = aModel([aDrive({ volumeLoss: certain(0.052) })]);
  return assessBuilding(model, walls, ofRow, RULES, [ALL_COMPLETE]);
}

describe('a building', () => {
  test('takes the worst of its walls and says which', () => {
    const walls = [aWall({ name: 'far', from: [0, 60], to: [0, 70] }), aWall({ name: 'near' })];
    const result = assessBuilding(aModel(), walls, [], RULES, [ALL_COMPLETE]);
    expect(result.walls[result.governing]?.wall.name).toBe('near');
    expect(result.strain).toBe(assessWall(aModel(), aWall(), RULES, []).strain);
    expect(result.walls).toHaveLength(2);
  });

  test('takes the worst moment and says which', () => {
    const parallel = aWall({ from: [-10, 6], to: [10, 6] });
    const passing = { name: 'face below', faces: [500] };
    const result = assessBuilding(aModel(), [parallel], [], RULES, [ALL_COMPLETE, passing]);
    expect(result.walls[result.governing]?.moment).toBe('face below');
    expect(result.strain).toBeGreaterThan(0);
    const [complete] = result.walls;
    expect(complete?.result.strain).toBe(0);
    expect(complete?.result.warnings).toContain('flat along the wall');
  });

  test('a terrace bends as one: the row reaches a category that none of its houses does', () => {
    const alone = HOUSES.map(({ id }) => assessHouse(id, false).category);
    const joined = HOUSES.map(({ id }) => assessHouse(id, true));
    expect(Math.max(...joined.map(({ category }) => category))).toBeGreaterThan(Math.max(...alone));
    const worst = joined.find(({ walls, governing }) => walls[governing]?.joined === true);
    expect(worst?.walls[worst.governing]?.wall.name).toMatch(/row$/);
  });

  test('a joined wall keeps the height and stiffness of its own house', () => {
    const [id = ''] = HOUSES.map((house) => house.id);
    const walls = wallsOf(id).map((wall) => ({ ...wall, height: 7, eOverG: certain(12.5) }));
    for (const { wall } of joinedWalls(id, walls, ROWS)) {
      expect(wall).toMatchObject({ height: 7, eOverG: certain(12.5) });
    }
    expect(joinedWalls(id, walls, ROWS).length).toBeGreaterThan(0);
  });

  test('without walls, or with walls of no length, it is not affected', () => {
    const point = aWall({ from: [0, 2], to: [0, 2] });
    for (const walls of [[], [point]]) {
      const result = assessBuilding(aModel(), walls, [], RULES, [ALL_COMPLETE]);
      expect(result).toMatchObject({ category: 0, strain: 0, governing: -1, settlementMax: 0 });
      expect(result.bracket).toBeUndefined();
    }
  });

  test('its breakpoint is the smallest of its walls', () => {
    const walls = [aWall({ name: 'one' }), aWall({ name: 'two', from: [0, 6], to: [0, 18] })];
    const result = assessBuilding(aModel(), walls, [], RULES, [ALL_COMPLETE]);
    const factors = result.walls.flatMap(({ breakpoint }) => breakpoint?.factor ?? []);
    expect(factors).toHaveLength(2);
    expect(result.breakpoint?.factor).toBe(Math.min(...factors));
  });

  test('its bracket is the worst of its walls at each combination', () => {
    const range = { low: 0.005, central: 0.015, high: 0.025 };
    const model = aModel([aDrive({ volumeLoss: range })]);
    const walls = [aWall(), aWall({ from: [0, 6], to: [0, 18] })];
    const { bracket, walls: each } = assessBuilding(model, walls, [], RULES, [ALL_COMPLETE]);
    for (const v of [0, 1, 2]) {
      const strains = each.map((wall) => wall.bracket.strains[0]?.[v]?.[2] ?? NaN);
      expect(bracket?.strains[0]?.[v]?.[2]).toBe(Math.max(...strains));
    }
  });

  test('carries method version and rules', () => {
    const { basis } = assessBuilding(aModel(), [aWall()], [], RULES, [ALL_COMPLETE]);
    expect(basis.methodVersion).toMatch(/^\d+\.\d+\.\d+$/);
    expect(basis.rules.cutOff).toEqual({ kind: 'settlement', settlement: 0.001 });
  });
});
