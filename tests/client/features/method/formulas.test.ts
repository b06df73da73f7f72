import { expect, test } from 'vitest';
import { namesIn, parseExpression } from '../../../../shared/presentation/parse-expression.ts';
import { SYMBOL_WORDS } from '../../../../shared/presentation/symbol-words.ts';
import { methodParts, symbolsOf } from '../../../../src/features/method/formulas/method-parts.ts';

const PARTS = methodParts();

test('the parts stand in the order of the work', () => {
  expect(PARTS.map(({ id }) => id)).toEqual([
    'movement',
    'depth',
    'focus',
    'face',
    'several',
    'zones',
    'deep-beam',
    'category',
    'rankin',
    'stages',
    'bracket',
    'samples',
  ]);
});

test('every symbol of every formula is said in words', () => {
  for (const part of PARTS) {
    const names = part.formulas.flatMap(({ expression }) => namesIn(parseExpression(expression)));
    const told = symbolsOf(part).map(({ symbol }) => symbol);
    expect(told.toSorted()).toEqual([...new Set(names)].filter((name) => name !== 'pi').toSorted());
  }
});

test('no formula stands twice in a part, and every symbol has a meaning', () => {
  for (const { formulas } of PARTS) {
    const written = formulas.map(({ symbol, expression }) => `${symbol} = ${expression}`);
    expect(new Set(written).size).toBe(written.length);
  }
  expect(Object.values(SYMBOL_WORDS).every(({ meaning }) => meaning !== '')).toBe(true);
});

test('formulas that workings write are the same here, whichever rule is chosen', () => {
  const all = PARTS.flatMap(({ formulas }) => formulas.map(({ expression }) => expression));
  expect(all).toContain('F * V_L * pi * D^2 / 4');
  expect(all).toContain('(ground - axis) * (1 + c) - (ground - founding)');
  expect(all).toContain('max(0, ε_c)');
  expect(all).toContain('(0.28 * z0 - 0.1) * h / z0');
  expect(all).toContain('H^3 / 3');
});
