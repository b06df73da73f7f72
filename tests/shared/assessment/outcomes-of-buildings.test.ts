import { describe, expect, test } from 'vitest';
import { caseOfBuilding } from '../../../shared/assessment/case-of-building.ts';
import { outcomesOfBuildings } from '../../../shared/assessment/outcomes-of-buildings.ts';
import { pieceBesideWall } from '../../../shared/assessment/piece-beside-wall.ts';
import { preparedBuilding } from '../../../shared/assessment/prepared-building.ts';
import { resultOfOutcome } from '../../../shared/assessment/result-of-outcome.ts';
import { assessmentRules, runInputs } from '../../../shared/assessment/run-inputs.ts';
import { sheetOfBuilding } from '../../../shared/assessment/sheet-of-building.ts';
import { rowsByBuilding } from '../../../shared/building/joined-walls.ts';
import { assessCaseSchema } from '../../../shared/schemas/assess-case.ts';
import { modelOfCase, wallOfCase } from '../../../shared/assessment/model-of-case.ts';
import type { RuleSet } from '../../../shared/schemas/rules.ts';
import { defaultRules } from '../../../server/commands/default-rules.ts';
import { aDesign, aRange } from '../../support/designs.ts';
import { aRing, someFacts } from '../../support/register-facts.ts';

const DESIGN = aDesign({
  volumeLoss: { low: 0.01, central: 0.02, high: 0.03 },
  troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
});
const RULES = defaultRules('2026-12-01');
const INPUTS = runInputs(DESIGN, RULES);

/** Five houses in a terrace across the line, and one that stands alone. */
const TERRACE = [0, 1, 2, 3, 4].map((k) =>
  someFacts({ id: String(k), parts: [[aRing(0, -25 + 10 * k, 10, 10)]] }),
);
const ALONE = someFacts({ id: '9', parts: [[aRing(60, 0, 10, 10)]] });

function withDepth(value: RuleSet['depth']['value']): RuleSet {
  return { ...RULES, depth: { ...RULES.depth, value } };
}

describe('the outcomes of buildings', () => {
  test('do not depend on who else is asked for, as long as the row is whole', () => {
    const together = outcomesOfBuildings(INPUTS, 0, [...TERRACE, ALONE], []);
    expect(together.map(({ id }) => id)).toEqual(['0', '1', '2', '3', '4', '9']);
    for (const facts of TERRACE) {
      const others = TERRACE.filter(({ id }) => id !== facts.id);
      const [one] = outcomesOfBuildings(INPUTS, 0, [facts], others);
      expect(one).toStrictEqual(together.find(({ id }) => id === facts.id));
    }
    const [torn] = outcomesOfBuildings(INPUTS, 0, TERRACE.slice(0, 1), []);
    expect(torn?.outcome).not.toStrictEqual(together[0]?.outcome);
  });

  test('are recorded figure by figure, nulls where screening let go', () => {
    const [far] = outcomesOfBuildings(
      INPUTS,
      0,
      [someFacts({ parts: [[aRing(0, 300, 9, 9)]] })],
      [],
    );
    expect(far && resultOfOutcome(far.outcome)).toMatchObject({
      stage: 1,
      strain: null,
      reserve: null,
    });
    const [near] = outcomesOfBuildings(INPUTS, 0, TERRACE, []);
    const strain = near?.outcome.strain;
    expect(near && resultOfOutcome(near.outcome)).toMatchObject({
      strain: strain?.strain.central,
      categoryHigh: strain?.category.high,
      breakpoint: strain?.breakpoint?.factor ?? null,
      governingWall: strain?.governing?.wall,
    });
  });
});

describe('a sheet', () => {
  const sheet = sheetOfBuilding(DESIGN, RULES, ALONE, rowsByBuilding([]));

  test('has the outcome of the run, with all walls at the strain stage', () => {
    const [alone] = outcomesOfBuildings(INPUTS, 0, [ALONE], []);
    expect(sheet.outcome).toStrictEqual(alone?.outcome);
    expect(sheet.strain?.walls.map(({ wall }) => wall.name)).toEqual(['a', 'b', 'c', 'd']);
    expect(sheet.strain?.strain).toBe(alone?.outcome.strain?.strain.central);
  });

  test('has no walls where the method refuses the levels', () => {
    const facts = { ...ALONE, foundingLevel: 3 };
    const refused = sheetOfBuilding(DESIGN, RULES, facts, rowsByBuilding([]));
    expect(refused.strain).toBeNull();
    expect(refused.outcome.fault).toContain('founding level');
  });

  test('names the piece beside a wall, with its inputs and the level of its axis', () => {
    const own = { from: 500, to: 700, volumeLoss: aRange(0.015), troughWidth: aRange(0.45) };
    const levels = [
      { chainage: 0, level: -20 },
      { chainage: 400, level: -24 },
    ];
    const { model } = runInputs(aDesign({ intervals: [own], levels }), RULES);
    const at = (east: number) =>
      pieceBesideWall(model, { segment: { start: [east, 5], end: [east, 15] } });
    const { volumeLoss, troughWidth } = own;
    expect(at(100)?.piece).toMatchObject({ volumeLoss, troughWidth });
    expect(at(-300)?.piece.volumeLoss.central).toBe(0.015);
    expect(at(-300)?.piece.troughWidth.central).toBe(0.5);
    expect(at(-300)?.axis).toBe(-22);
  });
});

describe('a case of a building', () => {
  test.each([
    ['clay', RULES],
    ['layered', withDepth({ kind: 'layered', layers: [{ baseLevel: -8, troughWidth: aRange(0.3) }, { baseLevel: -60, troughWidth: aRange(0.5) }] })],
    ['other rules', {
      ...RULES,
      focus: { ...RULES.focus, value: 'deep' },
      cutOff: { ...RULES.cutOff, value: { kind: 'widths', widths: 2 } },
      horizontalStrain: { ...RULES.horizontalStrain, value: 'peak' },
      compression: { ...RULES.compression, value: 'zero' },
      leadingCategory: { ...RULES.leadingCategory, value: 2 },
    }],
  ] satisfies [string, RuleSet][])('is read back as the run had it: %s', (_, rules) => {
    const inputs = runInputs(DESIGN, rules);
    const prepared = preparedBuilding(ALONE, inputs.model, 0);
    const exported = caseOfBuilding(inputs, DESIGN, prepared, rowsByBuilding([]));
    const { walls, ...others } = assessCaseSchema.parse(JSON.parse(JSON.stringify(exported)));
    const back = modelOfCase(others);
    expect(back.rules).toStrictEqual(assessmentRules(rules));
    expect(back.model.pieces).toStrictEqual(inputs.model.pieces);
    const read = walls.map((wall) => ({
      ...wallOfCase(wall, back.groundLevel),
      groundLevelAssumed: false,
    }));
    expect(read).toEqual(prepared.walls);
  });
}); // prettier-ignore
