import { describe, expect, it } from 'vitest';
import { formulaPieces, symbolPieces } from '../../../../server/documents/sheet/formula-words.ts';

function written(expression: string, figures?: Record<string, number>): string {
  const marks = { over: '^', under: '_' };
  return formulaPieces(expression, figures)
    .map(({ text, rise }) => (rise === undefined ? text : `${marks[rise]}{${text}}`))
    .join('');
}

describe('a formula in one line', () => {
  it.each([
    ['K * z0', 'K × z_{0}'],
    ['V_L * pi * D^2 / 4', 'V_{L} × π × D² / 4'],
    ['a / (b * c)', 'a / (b × c)'],
    ['(u_b - u_a) / (b - a)', '(u_{b} − u_{a}) / (b − a)'],
    ['DL / r_b + ε_h', '(Δ/L) / r_{b} + ε_{h}'],
    ['sqrt(x^2 + 1)', '√(x² + 1)'],
    ['abs(x - y)', '|x − y|'],
    ['x^n', 'x^{n}'],
    ['max(a, b)', 'max(a, b)'],
    ['(ε >= c1) + (ε >= c2)', '(ε ≥ c_{1}) + (ε ≥ c_{2})'],
  ])('%s', (expression, words) => {
    expect(written(expression)).toBe(words);
  });

  it('holds the figures in the place of names, a negative one in brackets', () => {
    expect(written('a - b * c', { a: 1, b: -2, c: 0.5 })).toBe('1 − (−2) × 0.5');
    expect(written('b^2', { b: -3 })).toBe('(−3)²');
    expect(written('a / b', { a: 0.00001234, b: 2 })).toBe('1.234\u2009×\u200910⁻⁵ / 2');
  });

  it('sets what follows an underscore under the line', () => {
    expect(symbolPieces('ε_bt')).toEqual([{ text: 'ε' }, { text: 'bt', rise: 'under' }]);
    expect(symbolPieces('EG')).toEqual([{ text: 'E/G' }]);
  });
});
