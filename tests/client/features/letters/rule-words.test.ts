import { expect, test } from 'vitest';
import { defaultLetterSettings } from '../../../../shared/schemas/letter-settings.ts';
import { ruleWords } from '../../../../src/features/letters/rule-words.ts';
import { draftOfSettings, readSettings } from '../../../../src/features/letters/settings-draft.ts';

const SETTINGS = defaultLetterSettings('2026-12-01');

test('a rule of shafts says how near, and is the same rule again once it was written', () => {
  const rule = SETTINGS.rules.find(({ shaftWithin }) => shaftWithin !== null);
  expect(rule && ruleWords(rule)).toBe('within 30 m of a shaft of the line');
  expect(readSettings(draftOfSettings(SETTINGS))).toEqual({ settings: SETTINGS });
});

test('a rule of shafts needs a figure', () => {
  const draft = draftOfSettings(SETTINGS);
  const rules = draft.rules.map((rule) => ({ ...rule, shaftWithin: 'near' }));
  expect(readSettings({ ...draft, rules })).toMatchObject({
    faults: { 'rules.0.shaftWithin': 'Write a number.' },
  });
});
