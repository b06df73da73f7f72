import { describe, expect, test } from 'vitest';
import { DEFAULT_HOLDS, type Hold } from '../../../shared/assessment/holds.ts';
import { DEFAULT_RULES, type AssessmentRules } from '../../../shared/assessment/rules.ts';
import {
  DEFAULT_SCREENING_LIMITS,
  type ScreeningLimits,
} from '../../../shared/assessment/screening.ts';
import { rulesSchema, type RuleSet } from '../../../shared/schemas/rules.ts';
import { defaultRules } from '../../../server/commands/default-rules.ts';

const DATE = '2026-12-01';

/** What the method takes, out of a scheme's rules: compiles only while each mirrors the other. */
function forMethod(rules: RuleSet): {
  rules: AssessmentRules;
  limits: ScreeningLimits;
  holds: readonly Hold[];
} {
  const { screening, holds, ...others } = rules;
  return {
    rules: {
      depth: others.depth.value,
      focus: others.focus.value,
      cutOff: others.cutOff.value,
      horizontalStrain: others.horizontalStrain.value,
      compression: others.compression.value,
      leadingCategory: others.leadingCategory.value,
    },
    limits: screening.value,
    holds: holds.map(({ name, condition, stages, source }) => ({
      name,
      condition,
      stages,
      source,
    })),
  };
}

function withRule(key: keyof RuleSet, value: unknown): unknown {
  return { ...defaultRules(DATE), [key]: { value, source: 'common-practice', date: DATE } };
}

function layered(...layers: readonly (readonly [base: number, K: number])[]): unknown {
  return {
    kind: 'layered',
    layers: layers.map(([baseLevel, K]) => ({
      baseLevel,
      troughWidth: { low: K - 0.05, central: K, high: K + 0.05 },
    })),
  };
}

describe('the default rules', () => {
  test('are those of the method, each with its source and the day', () => {
    const rules = rulesSchema.parse(JSON.parse(JSON.stringify(defaultRules(DATE))));
    expect(forMethod(rules)).toEqual({
      rules: DEFAULT_RULES,
      limits: DEFAULT_SCREENING_LIMITS,
      holds: DEFAULT_HOLDS,
    });
    const { holds, ...others } = rules;
    for (const { source, date } of [...holds, ...Object.values(others)]) {
      expect(source).not.toBe('');
      expect(date).toBe(DATE);
    }
  });

  test('can be changed to whatever else the method knows', () => {
    const others: readonly (readonly [keyof RuleSet, unknown])[] = [
      ['depth', { kind: 'oreilly-new-sand' }],
      ['depth', layered([0, 0.3], [-20, 0.5])],
      ['focus', 'deep'],
      ['cutOff', { kind: 'widths', widths: 2.5 }],
      ['cutOff', { kind: 'settlement', settlement: 0 }],
      ['horizontalStrain', 'peak'],
      ['compression', 'zero'],
      ['leadingCategory', 2],
      ['screening', { settlement: 0.005, slope: 0.001 }],
    ];
    for (const [key, value] of others) {
      expect([key, rulesSchema.safeParse(withRule(key, value)).success]).toEqual([key, true]);
    }
  });
});

describe('rules', () => {
  test.each<[string, unknown]>([
    ['layers from the bottom up', withRule('depth', layered([-20, 0.5], [0, 0.3]))],
    ['no layers', withRule('depth', { kind: 'layered', layers: [] })],
    ['a depth rule of its own making', withRule('depth', { kind: 'clay', slope: 1 })],
    ['millimetres for metres', withRule('cutOff', { kind: 'settlement', settlement: 1.5 })],
    ['a limit of nothing', withRule('screening', { settlement: 0, slope: 0.002 })],
    ['category 0 leading on', withRule('leadingCategory', 0)],
    ['category 5', withRule('leadingCategory', 5)],
    ['one rule missing', { ...defaultRules(DATE), focus: undefined }],
    ['one rule more', { ...defaultRules(DATE), colour: 'red' }],
    ['a work that is not cited', { ...defaultRules(DATE), focus: { value: 'axis', source: 'hearsay-1999', date: DATE } }], // prettier-ignore
    ['a source that every object has', { ...defaultRules(DATE), focus: { value: 'axis', source: 'toString', date: DATE } }], // prettier-ignore
    ['a day that is none', { ...defaultRules(DATE), focus: { value: 'axis', source: 'own', date: '2026-02-30' } }], // prettier-ignore
    ['a hold at no stage', { ...defaultRules(DATE), holds: [{ ...defaultRules(DATE).holds[0], stages: [] }] }], // prettier-ignore
    ['a hold at stage 3', { ...defaultRules(DATE), holds: [{ ...defaultRules(DATE).holds[0], stages: [3] }] }], // prettier-ignore
    ['two holds of one name', { ...defaultRules(DATE), holds: [defaultRules(DATE).holds[0], defaultRules(DATE).holds[0]] }], // prettier-ignore
  ])('are not taken with %s', (_, rules) => {
    expect(rulesSchema.safeParse(rules).success).toBe(false);
  });
});
