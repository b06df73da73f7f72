import { expect, test } from 'vitest';
import type { Conclusion } from '../../../shared/assessment/conclusion.ts';
import { needsReason, whyNotDecided } from '../../../shared/assessment/decision-kinds.ts';
import { DECISION_KINDS } from '../../../shared/schemas/decisions.ts';

const AT_TWO: Conclusion = {
  ...{ stage: 2, categoryLow: 0, category: 1, categoryHigh: 2, isSettled: false },
  ...{ heldBy: [], sensitivityTotal: null, isWorkedOut: true },
};

const CASES: readonly (readonly [what: string, Conclusion, readonly string[]])[] = [
  ['let go by screening', { ...AT_TWO, stage: 1, category: null }, ['let go at stage 1']],
  ['let go by its strain', AT_TWO, ['let go at stage 2']],
  ['of category 3', { ...AT_TWO, stage: 3, category: 3 }, ['no measures']],
  ['held', { ...AT_TWO, stage: 3, heldBy: ['listed'] }, ['no measures']],
  ['that screening lets go no longer', { ...AT_TWO, stage: null, category: null }, ['no measures']],
  ['not worked out', { ...AT_TWO, stage: 3, category: null, isWorkedOut: false }, ['no measures']],
];
const ALWAYS = ['go to stage 3', 'adopt a category', 'protective measures'];

test.each(CASES)('a building %s can have what its figures allow', (_, conclusion, own) => {
  const open = DECISION_KINDS.filter((kind) => whyNotDecided(kind, conclusion) === null);
  expect([...open].sort()).toEqual([...own, ...ALWAYS].sort());
});

test('says what holds it, or which category leads on', () => {
  const at = (changes: Partial<Conclusion>) =>
    whyNotDecided('let go at stage 2', { ...AT_TWO, stage: 3, ...changes });
  expect(at({ heldBy: ['listed', 'poor condition'] })).toBe(
    'Held because: listed, poor condition.',
  );
  expect(at({ category: 3 })).toBe('Category 3 leads on.');
});

test('asks why wherever the figures alone do not say it', () => {
  expect(needsReason('let go at stage 1', { stage: 1 })).toBe(false);
  expect(needsReason('go to stage 3', { stage: 3 })).toBe(false);
  expect(needsReason('go to stage 3', { stage: 1 })).toBe(true);
  expect(needsReason('adopt a category', { stage: 3 })).toBe(true);
  expect(needsReason('no measures', { stage: 3 })).toBe(true);
});
