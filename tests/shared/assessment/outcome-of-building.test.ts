import { describe, expect, test } from 'vitest';
import { assessBuilding } from '../../../shared/assessment/assess-building.ts';
import { DEFAULT_HOLDS } from '../../../shared/assessment/holds.ts';
import { ALL_COMPLETE } from '../../../shared/assessment/moment.ts';
import {
  outcomeOfBuilding,
  type RunInputs,
} from '../../../shared/assessment/outcome-of-building.ts';
import { preparedBuilding } from '../../../shared/assessment/prepared-building.ts';
import { DEFAULT_SCREENING_LIMITS, screenFootprint } from '../../../shared/assessment/screening.ts';
import { joinedWalls, rowsByBuilding } from '../../../shared/building/joined-walls.ts';
import { rows } from '../../../shared/building/rows.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import { certain } from '../../../shared/numerics/range.ts';
import { aDrive, aModel, someRules } from '../../support/builders.ts';
import { notFinite } from '../../support/not-finite.ts';
import { aRing, noFacts, someFacts } from '../../support/register-facts.ts';
import { terrace } from '../../support/terraces.ts';

const NO_ROWS = rowsByBuilding([]);
const RANGES = {
  volumeLoss: { low: 0.005, central: 0.01, high: 0.015 },
  troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
};

function inputs(volumeLoss: Partial<(typeof RANGES)['volumeLoss']> = {}): RunInputs {
  const drive = aDrive({ ...RANGES, volumeLoss: { ...RANGES.volumeLoss, ...volumeLoss } });
  return {
    ...{ model: aModel([drive]), rules: someRules() },
    ...{ limits: DEFAULT_SCREENING_LIMITS, holds: DEFAULT_HOLDS },
    line: null,
  };
}

/** High losses, and a house across the trough that they break. */
const HEAVY = { low: 0.02, central: 0.06, high: 0.08 };
const ACROSS = [[aRing(0, -10, 10, 50)]];
const FAR = [[aRing(0, 60, 10, 10)]];

function outcomeOf(facts = someFacts(), run = inputs()) {
  return outcomeOfBuilding(run, preparedBuilding(facts, run.model, 0), NO_ROWS);
}

describe('the outcome of a building', () => {
  test('lets it go at stage 1 with the figures of the screening', () => {
    const run = inputs();
    const building = preparedBuilding(someFacts({ parts: FAR }), run.model, 0);
    const screening = screenFootprint(run.model, building, run.rules, run.limits, [ALL_COMPLETE]);
    const { settlementMax, slopeMax } = screening;
    expect(screening.passes).toBe(true);
    expect(outcomeOfBuilding(run, building, NO_ROWS)).toEqual({
      ...{ stage: 1, heldBy: [], strain: null, fault: null, assumed: [], place: null },
      ...{ settlement: settlementMax, slope: slopeMax, warnings: screening.warnings },
    });
  });

  test('holds at stage 1 a building that screening alone would let go', () => {
    const piled = outcomeOf(someFacts({ parts: FAR, foundation: 'piled' }));
    expect(piled).toMatchObject({ stage: 3, heldBy: ['piled'], fault: null });
    expect(piled.strain?.category.high).toBe(0);
    const deep = outcomeOf(someFacts({ parts: FAR, foundingLevel: -4.5 }));
    expect(deep).toMatchObject({ stage: 3, heldBy: ['founded deeper than 4 m'] });
    // a listing says nothing at stage 1
    expect(outcomeOf(someFacts({ parts: FAR, listedGrade: 'listed' })).stage).toBe(1);
  });

  test('lets it go at stage 2, unless it is held there', () => {
    const passed = outcomeOf(someFacts({ parts: ACROSS }));
    expect(passed).toMatchObject({ stage: 2, heldBy: [] });
    expect(passed.strain?.category.central).toBeLessThan(3);
    const held = outcomeOf(someFacts({ parts: ACROSS, listedGrade: 'Grade I', condition: 'poor' }));
    expect(held).toMatchObject({ stage: 3, heldBy: ['listed', 'poor condition'] });
    expect(held.strain).toEqual(passed.strain);
  });

  test('leads to stage 3 from the category that leads on', () => {
    const result = outcomeOf(someFacts({ parts: ACROSS }), inputs(HEAVY));
    expect(result).toMatchObject({ stage: 3, heldBy: [], fault: null });
    expect(result.strain?.category.central).toBeGreaterThanOrEqual(3);
  });

  test('has the figures of assessBuilding and screenFootprint', () => {
    const run = inputs(HEAVY);
    const building = preparedBuilding(noFacts({ parts: ACROSS }), run.model, 0);
    const result = assessBuilding(run.model, building.walls, [], run.rules, [ALL_COMPLETE]);
    const screening = screenFootprint(run.model, building, run.rules, run.limits, [ALL_COMPLETE]);
    const found = outcomeOfBuilding(run, building, NO_ROWS);
    const strains = result.bracket?.strains.flat(2) ?? [];
    expect(strains).toHaveLength(15);
    const worst = result.walls[result.governing];
    const zone = worst?.result.zones[worst.result.governingZone];
    expect(found).toMatchObject({
      settlement: screening.settlementMax,
      slope: screening.slopeMax,
      assumed: building.assumed,
      strain: {
        strain: {
          low: Math.min(...strains),
          central: result.strain,
          high: Math.max(...strains),
        },
        settlement: result.settlementMax,
        slope: result.slopeMax,
        rankin: result.rankin,
        breakpoint: result.breakpoint,
        isSettled: result.sensitivity?.settled,
        sensitiveTo: result.sensitivity?.input ?? null,
        governing: {
          ...{ wall: worst?.wall.name, isRow: false, mode: zone?.mode },
          ...{ deflectionRatio: zone?.deflectionRatio, horizontalStrain: zone?.horizontalStrain },
        },
      },
    });
    expect(found.strain?.category).toEqual({
      low: found.strain?.category.low,
      central: result.category,
      high: found.strain?.category.high,
    });
    expect(strains).toContain(result.strain);
    expect(new Set(found.warnings)).toEqual(new Set([...screening.warnings, ...result.warnings]));
    expect(notFinite(found)).toEqual([]);
  });

  test('says so where nothing of it is affected at stage 2', () => {
    const { strain } = outcomeOf(
      someFacts({ parts: FAR, foundation: 'piled' }),
      inputs({ low: 0 }),
    );
    expect(strain).toMatchObject({
      ...{ strain: { low: 0, central: 0, high: 0 }, governing: null, isSettled: true },
    });
  });

  test('takes the row it stands in where that is worse', () => {
    const fronts = Array.from({ length: 9 }, (_, k): PlanPoint => [0, 2 + 5 * k]);
    const houses = terrace(fronts, fronts.map(([x, y]): PlanPoint => [x - 8, y])); // prettier-ignore
    const run = {
      ...inputs(),
      model: aModel([aDrive({ volumeLoss: certain(0.052) })]),
    };
    const ofRows = rowsByBuilding(rows(houses));
    const governing = houses.flatMap(({ id, walls }) => {
      const base = preparedBuilding(someFacts({ id, eavesHeight: 5 }), run.model, 0);
      const [wall] = base.walls;
      if (wall === undefined) return [];
      const own = { ...base, walls: walls.map((segment) => ({ ...wall, segment })) };
      const joined = joinedWalls(id, own.walls, ofRows);
      const result = assessBuilding(run.model, own.walls, joined, run.rules, [ALL_COMPLETE]);
      const found = outcomeOfBuilding(run, own, ofRows);
      expect(found.strain?.strain.central).toBe(result.strain);
      return [found.strain?.governing];
    });
    expect(governing.some((one) => one?.isRow === true && one.wall.endsWith(', row'))).toBe(true);
  });

  test('asks every moment it is given', () => {
    const notBegun = { name: 'not begun', faces: [0] };
    const across = someFacts({ parts: ACROSS });
    const before = outcomeOf(across, { ...inputs(), moments: [notBegun] });
    expect(before).toMatchObject({ stage: 1, settlement: 0, slope: 0 });
    const both = outcomeOf(across, { ...inputs(), moments: [notBegun, ALL_COMPLETE] });
    expect(both.strain?.strain).toEqual(outcomeOf(across).strain?.strain);
  });
});

describe('a building that cannot be worked out', () => {
  test('founded above its ground says so, and is looked at', () => {
    const found = outcomeOf(someFacts({ foundingLevel: 1 }));
    expect(found).toMatchObject({ stage: 3, strain: null, settlement: 0, warnings: [] });
    expect(found.fault).toMatch(/founding level of 1 m is above the ground level of 0 m/);
  });

  test('founded below the crown of a drive beside it says so', () => {
    const found = outcomeOf(someFacts({ foundingLevel: -18 }));
    expect(found.stage).toBe(3);
    expect(found.fault).toMatch(/not above the crown/);
  });

  test('passes on what is no refusal', () => {
    const run = inputs();
    const broken = new Map(NO_ROWS);
    broken.get = () => {
      throw new TypeError('rows of nobody');
    };
    const building = preparedBuilding(someFacts({ parts: ACROSS }), run.model, 0);
    expect(() => outcomeOfBuilding(run, building, broken)).toThrow('rows of nobody');
  });
});
