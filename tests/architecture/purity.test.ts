import { describe, expect, it } from 'vitest';
import { filesIn, parsed, sourcesIn, textOf } from '../support/source-files.ts';
import { inexactUses, moduleState } from './purity.ts';

const shared = sourcesIn('shared');

/** Files that name an outside address. */
function outsideAddresses(files: readonly { path: string; text: string }[]): string[] {
  return files.filter(({ text }) => /https?:\/\//i.test(text)).map(({ path }) => path);
}

describe('shared gives the same bits in every engine', () => {
  it.each([
    'Math.sin(1)',
    'Math.pow(2, 3)',
    'Math.hypot(3, 4)',
    'Math.random()',
    "Math['sqrt'](2)",
    'const { sqrt } = Math',
    'globalThis.Math',
    '2 ** 3',
    'x **= 2',
  ])('not by %s', (text) => {
    expect(inexactUses(parsed('shared/x.ts', text))).toHaveLength(1);
  });

  it('by the functions that are rounded exactly', () => {
    const text = 'Math.sqrt(Math.abs(x)) * Math.PI * Math.SQRT1_2; // Math.sin';
    expect(inexactUses(parsed('shared/x.ts', text))).toEqual([]);
    expect(shared.flatMap(inexactUses)).toEqual([]);
  });
});

describe('shared keeps nothing from one call to the next', () => {
  it.each(['let a = 1;', 'export let a = 1;', 'var a = 1;'])('not by %s', (text) => {
    expect(moduleState(parsed('shared/x.ts', text))).toHaveLength(1);
  });

  it('in a variable of a module', () => {
    const inside = 'const a = 1; function f(): void { let b = 1; }';
    expect(moduleState(parsed('shared/x.ts', inside))).toEqual([]);
    expect(shared.flatMap(moduleState)).toEqual([]);
  });
});

describe('shared names no outside address', () => {
  it.each(['http', 'https'])('by %s', (scheme) => {
    const file = { path: 'shared/x.json', text: `"${scheme}://example.org"` };
    expect(outsideAddresses([file])).toEqual(['shared/x.json']);
  });

  it('in any of its files', () => {
    const files = filesIn('shared').map((path) => ({ path, text: textOf(path) }));
    expect(outsideAddresses(files)).toEqual([]);
  });
});
