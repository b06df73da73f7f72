import { describe, expect, it } from 'vitest';
import { openWall } from '../../../../shared/assessment/open-wall.ts';
import { runInputs } from '../../../../shared/assessment/run-inputs.ts';
import { sheetOfBuilding } from '../../../../shared/assessment/sheet-of-building.ts';
import type { PlanPoint } from '../../../../shared/geometry/point.ts';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';
import type { RuleSet } from '../../../../shared/schemas/rules.ts';
import { defaultRules } from '../../../../server/commands/default-rules.ts';
import { readDraft, readLeftOut } from '../../../../src/features/method/what-if/what-if-address.ts';
import { workWhatIf } from '../../../../src/features/method/what-if/work-what-if.ts';
import { whatIfOfWall } from '../../../../src/features/sheet/what-if-of-wall.ts';
import { aDesign, aRange } from '../../../support/designs.ts';
import { someFacts } from '../../../support/register-facts.ts';

const RULES = defaultRules('2026-12-01');
const STRAIGHT = aDesign({
  volumeLoss: { low: 0.01, central: 0.015, high: 0.022 },
  troughWidth: { low: 0.4, central: 0.5, high: 0.6 },
});

const OTHER = { volumeLoss: aRange(0.02), troughWidth: aRange(0.5) };

/** Four walls at an angle, two of which cross the axis. */
const TURNED: PlanPoint[] = [[-6, -5], [8, 3], [2, 14], [-12, 6], [-6, -5]]; // prettier-ignore

function wallsOf(design: AlignmentDesign, rules: RuleSet = RULES) {
  const facts = someFacts({ parts: [[TURNED]], groundLevel: 2, foundingLevel: 0.6 });
  const { inputs, strain } = sheetOfBuilding(design, rules, facts, new Map());
  return (strain?.walls ?? []).map(({ wall }) => {
    const path = whatIfOfWall(inputs.model, wall, inputs.rules) ?? '';
    const search = new URLSearchParams(path.split('?')[1]);
    return { wall, inputs, search };
  });
}

function leftOut(overrides: Partial<AlignmentDesign>, rules?: RuleSet) {
  const [first] = wallsOf({ ...STRAIGHT, ...overrides }, rules);
  return first && readLeftOut(first.search);
}

describe('a wall of a sheet tried out', () => {
  it.each([
    ['driven east', STRAIGHT],
    ['driven west', { ...STRAIGHT, direction: 'backward' as const }],
    [
      'beside its line',
      aDesign({
        ...STRAIGHT,
        line: [
          [-600, 4],
          [600, 4],
        ],
      }),
    ],
    [
      'to the north-east',
      aDesign({
        ...STRAIGHT,
        line: [
          [-400, -403],
          [400, 397],
        ],
      }),
    ],
  ])('begins with the figures of the sheet over one straight drive, %s', (_name, design) => {
    const walls = wallsOf(design);
    expect(walls).toHaveLength(4);
    for (const { wall, inputs, search } of walls) {
      expect(readLeftOut(search)).toEqual([]);
      const tried = workWhatIf(readDraft(search));
      if (tried.kind === 'faults') throw new Error(JSON.stringify(tried.faults));
      const ofSheet = openWall(inputs.model, wall, inputs.rules, []);
      const { bracket, breakpoint, result } = tried.opened;
      // the address keeps millimetres and thousandths of a degree
      const near = (figure: number | undefined) => expect.closeTo(figure ?? NaN, 6) as number;
      expect(result.zones.map(({ mode }) => mode)).toEqual(ofSheet.result.zones.map(({ mode }) => mode)); // prettier-ignore
      expect(result.category).toBe(ofSheet.result.category);
      expect(result.strain).toEqual(near(ofSheet.result.strain));
      expect(result.settlementMax).toEqual(near(ofSheet.result.settlementMax));
      expect(bracket.strains.flat(2)).toEqual(ofSheet.bracket.strains.flat(2).map(near));
      expect(breakpoint?.factor.toFixed(2)).toBe(ofSheet.breakpoint?.factor.toFixed(2));
    }
  });

  it.each([
    [{ bores: { kind: 'twin', spacing: 14, later: 'left', laterFactor: 1.2 } }, ['drives']],
    [{ line: [[-500, 0], [40, 0], [500, 60]] }, ['bends']],
    [{ levels: [{ chainage: 0, level: -20 }, { chainage: 1000, level: -25 }] }, ['climbs']],
    [{ intervals: [{ from: 540, to: 700, ...OTHER }] }, ['inputs']],
    [{ line: [[-500, 0], [60, 0]] }, ['ends']],
    [{ line: [[-500, 0], [300, 0], [500, 60]], intervals: [{ from: 700, to: 720, ...OTHER }] }, []],
  ] satisfies [Partial<AlignmentDesign>, string[]][])('says what is left out: %o', (design, words) => {
    expect(leftOut(design)).toEqual(words);
  }); // prettier-ignore

  it('says that a run went by rules of its own', () => {
    const rules = { ...RULES, focus: { ...RULES.focus, value: 'deep' as const } };
    expect(leftOut({}, rules)).toEqual(['rules']);
  });

  it('is not offered where nothing is driven', () => {
    const [first] = wallsOf(STRAIGHT);
    if (first === undefined) throw new Error('There are four walls.');
    const { model, rules } = runInputs(STRAIGHT, RULES);
    expect(whatIfOfWall({ ...model, pieces: [] }, first.wall, rules)).toBeUndefined();
  });
});
