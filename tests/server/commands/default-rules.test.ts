import { describe, expect, test } from 'vitest';
import { DEFAULT_HOLDS, type Hold } from '../../../shared/assessment/holds.ts';
import { DEFAULT_RULES, type AssessmentRules } from '../../../shared/assessment/rules.ts';
import {
  DEFAULT_SCREENING_LIMITS,
  type ScreeningLimits,
} from '../../../shared/assessment/screening.ts';
import { DEFAULT_SENSITIVITY } from '../../../shared/damage/sensitivity-score.ts';
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

function scored(...structure: readonly { score: number; reason: string }[]): unknown {
  return withRule('sensitivity', { structure, features: [] });
}

describe('the default rules', () => {
  test('are those of the method, each with its source and the day', () => {
    const rules = rulesSchema.parse(JSON.parse(JSON.stringify(defaultRules(DATE))));
    expect(forMethod(rules)).toEqual({
      rules: DEFAULT_RULES,
      limits: DEFAULT_SCREENING_LIMITS,
      holds: DEFAULT_HOLDS,
    });
    expect(rules.sensitivity).toEqual({
      value: DEFAULT_SENSITIVITY,
      source: 'common-practice',
      date: DATE,
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
      ['sensitivity', { structure: [{ score: 2, reason: 'Leaning' }], features: [] }],
    ];
    for (const [key, value] of others) {
      expect([key, rulesSchema.safeParse(withRule(key, value)).success]).toEqual([key, true]);
    }
  });
});

describe('rules', () => {
  test('that were kept before there were reasons for scores have the default ones', () => {
    const { sensitivity, ...before } = defaultRules(DATE);
    expect(rulesSchema.parse(before)).toEqual({ ...before, sensitivity });
  });

  test('may have the same reason for structure and for features', () => {
    const reasons = [{ score: 1, reason: 'Leaning' }];
    const rules = withRule('sensitivity', { structure: reasons, features: reasons });
    expect(rulesSchema.safeParse(rules).success).toBe(true);
  });

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
    ['a score of 3', scored({ score: 3, reason: 'Leaning' })],
    ['half a score', scored({ score: 0.5, reason: 'Leaning' })],
    ['a score without a reason', scored({ score: 1, reason: ' ' })],
    ['a reason of two lines', scored({ score: 1, reason: 'Leaning\nand cracked' })],
    ['a reason that is too long', scored({ score: 1, reason: 'x'.repeat(201) })],
    ['a reason twice', scored({ score: 1, reason: 'Leaning' }, { score: 2, reason: ' Leaning' })],
    ['more than 30 reasons', scored(...Array.from({ length: 31 }, (_, k) => ({ score: 1, reason: `Reason ${k}` })))], // prettier-ignore
  ])('are not taken with %s', (_, rules) => {
    expect(rulesSchema.safeParse(rules).success).toBe(false);
  });
});
