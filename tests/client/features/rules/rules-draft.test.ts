// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { rulesSchema, type RuleSet } from '../../../../shared/schemas/rules.ts';
import { defaultRules } from '../../../../server/commands/default-rules.ts';
import { checkDraft } from '../../../../src/features/rules/check-draft.ts';
import {
  fromMetres,
  fromSlope,
  toMetres,
  toNumber,
  toSlope,
} from '../../../../src/features/rules/display-units.ts';
import { rebasedDraft } from '../../../../src/features/rules/rebased-draft.ts';
import { ruleChanges } from '../../../../src/features/rules/rule-lines.ts';
import { conditionInWords, RULES, ruleValue } from '../../../../src/features/rules/rule-words.ts';
import { blankLayer, draftOf, rulesOf } from '../../../../src/features/rules/rules-draft.ts';
import { sourceInFull, sourceWords } from '../../../../shared/presentation/source-words.ts';
import { SOURCE_OPTIONS } from '../../../../src/features/rules/source-options.ts';

const RULES_OF_TODAY = defaultRules('2026-05-01');

const LAYERED: RuleSet = {
  ...RULES_OF_TODAY,
  depth: {
    ...RULES_OF_TODAY.depth,
    value: {
      kind: 'layered',
      layers: [
        { baseLevel: -4.5, troughWidth: { low: 0.25, central: 0.3, high: 0.35 } },
        { baseLevel: -40, troughWidth: { low: 0.4, central: 0.5, high: 0.6 } },
      ],
    },
  },
  cutOff: { ...RULES_OF_TODAY.cutOff, value: { kind: 'widths', widths: 2.5 } },
};

async function faultsOf(draft: ReturnType<typeof draftOf>) {
  const options = { fields: {}, shouldUseNativeValidation: false } as const;
  const { errors } = await checkDraft(draft, undefined, options);
  return errors;
}

describe('a draft of rules', () => {
  it.each([
    ['the defaults', RULES_OF_TODAY],
    ['layers and widths', LAYERED],
  ])('comes back as it was: %s', (_, rules) => {
    expect(rulesSchema.parse(rulesOf(draftOf(rules)))).toEqual(rules);
  });

  it('is written in the units that people use', () => {
    const { screening, cutOff } = draftOf(RULES_OF_TODAY);
    expect(screening.value).toEqual({ settlement: '10', slope: '500' });
    expect(cutOff.value.settlement).toBe('1');
  });

  it.each(['600', '333', '10.5', '750', '1200', '0.1', '12.34'])(
    'writes %s as it was typed',
    (text) => {
      expect(fromSlope(toSlope(text))).toBe(text);
      expect(fromMetres(toMetres(text))).toBe(text);
    },
  );

  it('writes a slope that was kept with fewer figures as it was meant', () => {
    expect(fromSlope(0.00166666666667)).toBe('600');
  });

  it('keeps the whole number behind what is typed', () => {
    expect([toSlope('600'), toMetres('0.1'), toSlope('10,5')]).toEqual([1 / 600, 0.0001, 1 / 10.5]);
    expect(['1e9', '1,000.5', '0x10', '1 in 500'].map(toSlope)).toEqual([NaN, NaN, NaN, NaN]);
  });

  it('says what is wrong with a slope in its own terms', async () => {
    for (const [typed, words] of [
      ['1e9', 'Give a figure, such as 12.5.'],
      ['0.5', 'Give 1 or more.'],
      ['-3', 'Give 1 or more.'],
    ] as const) {
      const draft = draftOf(RULES_OF_TODAY);
      draft.screening.value.slope = typed;
      const { screening } = await faultsOf(draft);
      expect(screening?.value?.slope?.message).toBe(words);
    }
  });

  it('laid on a newer version keeps what was written and takes the rest', () => {
    const newer: RuleSet = {
      ...RULES_OF_TODAY,
      focus: { ...RULES_OF_TODAY.focus, value: 'deep' },
      compression: { ...RULES_OF_TODAY.compression, value: 'zero' },
    };
    const mine = draftOf(RULES_OF_TODAY);
    mine.screening.value.settlement = '12';
    mine.compression = { ...mine.compression, date: '2026-06-01' };
    const laid = rebasedDraft(mine, draftOf(RULES_OF_TODAY), draftOf(newer));
    expect(laid.screening.value.settlement).toBe('12');
    expect(laid.focus.value).toBe('deep');
    expect(laid.compression).toEqual(mine.compression);
  });

  it('takes a comma for a point, and nothing for no figure', () => {
    expect(['2,5', ' 3 ', '−1.5', '', 'twelve'].map(toNumber)).toEqual([2.5, 3, -1.5, NaN, NaN]);
  });

  it('has its faults where they were written', async () => {
    const draft = draftOf(RULES_OF_TODAY);
    draft.screening.value.settlement = 'twelve';
    draft.cutOff.value.settlement = '-1';
    draft.screening.date = '';
    const errors = await faultsOf(draft);
    expect(errors.screening?.value?.settlement?.message).toBe('Give a figure, such as 12.5.');
    expect(errors.cutOff?.value?.settlement?.message).toBe('This is too small.');
    expect(errors.screening?.date?.message).toBe('Give a day.');
  });

  it('asks for a reason for each score, once', async () => {
    const draft = draftOf(RULES_OF_TODAY);
    draft.sensitivity.value.structure = [{ score: '1', reason: '' }];
    draft.sensitivity.value.features = [
      { score: '1', reason: 'Organ' },
      { score: '2', reason: 'Organ' },
    ];
    const faults = (await faultsOf(draft)).sensitivity?.value;
    expect(faults?.structure?.[0]?.reason?.message).toBe('Give the reason.');
    const { features } = faults ?? {};
    expect(features?.message ?? features?.root?.message).toBe('Give each reason once.');
  });

  it('asks for layers and for their order', async () => {
    const draft = draftOf(RULES_OF_TODAY);
    draft.depth.value = { kind: 'layered', layers: [] };
    expect((await faultsOf(draft)).depth?.value?.layers?.message).toBe('Give at least one.');
    const layer = { ...blankLayer(), baseLevel: '-5' };
    layer.troughWidth = { low: '0.5', central: '0.4', high: '0.6' };
    draft.depth.value.layers = [layer];
    const faults = (await faultsOf(draft)).depth?.value?.layers?.[0]?.troughWidth;
    expect(faults?.message ?? faults?.root?.message).toBe('Keep to the order low, central, high.');
  });
});

describe('rules in words', () => {
  it('say what holds in the scheme', () => {
    const words = RULES.map(({ rule }) => ruleValue(RULES_OF_TODAY, rule));
    expect(words).toEqual([
      '10\u00a0mm and 1 in 500',
      'K grows with depth, as in clay',
      'the axis',
      'settlement below 1\u00a0mm',
      'the average over the zone',
      'counted',
      'category 3, moderate',
    ]);
    expect(ruleValue(LAYERED, 'depth')).toBe(
      'K by layers: 0.25, 0.3, 0.35 down to −4.5\u00a0m; 0.4, 0.5, 0.6 down to −40\u00a0m',
    );
    expect(ruleValue(LAYERED, 'cutOff')).toContain('2.5 trough widths');
  });

  it('say when a hold acts', () => {
    const words = RULES_OF_TODAY.holds.map(({ condition }) => conditionInWords(condition));
    expect(words).toContain('founded deeper than 4\u00a0m');
    expect(words).toContain('sensitivity and category together from 3');
    expect(words).toContain('listed');
  });

  it('say what one version changed in the one before', () => {
    const after: RuleSet = {
      ...RULES_OF_TODAY,
      focus: { value: 'deep', source: 'common-practice', date: '2026-06-01' },
      holds: RULES_OF_TODAY.holds.slice(1),
    };
    const changes = ruleChanges(RULES_OF_TODAY, after);
    expect(changes.slice(0, 3)).toEqual([
      { path: 'Ground moves towards', before: 'the axis', after: 'a point below the axis' },
      {
        path: 'Ground moves towards: source',
        before: "O'Reilly and New 1982",
        after: 'Common practice',
      },
      { path: 'Ground moves towards: holds from', before: '1 May 2026', after: '1 Jun 2026' },
    ]);
    expect(changes.slice(3).map(({ after: now }) => now)).toEqual([
      undefined,
      undefined,
      undefined,
    ]);
    expect(ruleChanges(after, after)).toEqual([]);
  });

  it('say which reason scores otherwise, came or went, and the source of them all once', () => {
    const { sensitivity } = RULES_OF_TODAY;
    const [fair, irregular, ...others] = sensitivity.value.structure;
    if (fair === undefined || irregular === undefined) throw new Error('No reasons.');
    const structure = [fair, { ...irregular, score: 2 } as const, ...others.slice(1)];
    const features = [{ score: 1, reason: 'Organ' } as const, ...sensitivity.value.features];
    const value = { structure, features };
    const after: RuleSet = {
      ...RULES_OF_TODAY,
      sensitivity: { value, source: 'own', date: '2026-06-01' },
    };
    const changes = ruleChanges(RULES_OF_TODAY, after);
    expect(changes.map(({ path }) => path)).toEqual([
      `Structure score: ${irregular.reason}`,
      'Structure score: Moved or repaired before',
      'Sensitivity scores: source',
      'Sensitivity scores: holds from',
      'Features score: Organ',
    ]);
    expect(changes[0]).toMatchObject({ before: 'score 1', after: 'score 2' });
    expect(changes[1]).toMatchObject({ before: 'score 1', after: undefined });
    expect(changes[4]).toMatchObject({ before: undefined, after: 'score 1' });
  });
});

describe('sources', () => {
  it('are named by their authors and year', () => {
    expect(sourceWords('mair-taylor-burland-1996')).toBe('Mair, Taylor and Burland 1996');
    expect(sourceWords('burland-1995')).toBe('Burland 1995');
    expect(sourceWords('common-practice')).toBe('Common practice');
    expect(sourceInFull('rankin-1988')).toContain('1988');
    expect(SOURCE_OPTIONS.map(({ value }) => value)).toContain('burland-1995');
  });
});
