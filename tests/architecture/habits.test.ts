import { describe, expect, it } from 'vitest';
import { parsed, sourcesIn } from '../support/source-files.ts';
import { casts, commentFaults, exportFaults, typeFaults, undeclaredFunctions } from './habits.ts';
import { leftOutTests } from './left-out-tests.ts';
import { fileSize } from './sizes.ts';

const rooms = sourcesIn('shared', 'server', 'src');
const written = [...rooms, ...sourcesIn('scripts')];
const all = [...written, ...sourcesIn('tests')];

function sample(text: string, file = 'shared/x.ts') {
  return parsed(file, text);
}

describe('exports', () => {
  it.each([
    'export default function f(): void {}',
    'const a = 1; export default a;',
    'const a = 1; export { a as default };',
  ])('have names: not %s', (text) => {
    expect(exportFaults(sample(text))).toHaveLength(1);
  });

  it('are not passed on by barrels, except by the indexes of models and routes', () => {
    const text = `import './a.ts'; export * from './b.ts'; export { c } from './c.ts';`;
    expect(exportFaults(sample(text))).toHaveLength(1);
    expect(exportFaults(sample(text, 'server/models/index.ts'))).toEqual([]);
    expect(exportFaults(sample(`${text} export const d = 1;`))).toEqual([]);
  });

  it('keep to that', () => {
    expect(rooms.flatMap(exportFaults)).toEqual([]);
  });
});

describe('functions of a module', () => {
  it.each(['const f = () => 1;', 'export const f = function () {};'])(
    'are declared: not %s',
    (text) => {
      expect(undeclaredFunctions(sample(text))).toHaveLength(1);
    },
  );

  it('keep to that', () => {
    expect(undeclaredFunctions(sample('function f(): void { const g = () => 1; }'))).toEqual([]);
    expect(all.flatMap(undeclaredFunctions)).toEqual([]);
  });
});

describe('types', () => {
  it.each([
    'interface A { b: number }',
    'function f(a: any): void {}',
    'const a = b!;',
    'let a!: number;',
    'class A { b!: number }',
  ])('are not forced: not %s', (text) => {
    expect(typeFaults(sample(text))).toHaveLength(1);
  });

  it('keep to that', () => {
    expect(all.flatMap(typeFaults)).toEqual([]);
  });

  it('are told to the compiler at most once in a thousand lines', () => {
    const text = 'const a = [b as C, <C>d, e as const] as const; import { f as g } from "./f.ts";';
    expect(casts(sample(text))).toHaveLength(2);
    const lines = written.reduce((sum, file) => sum + fileSize(file).lines, 0);
    const found = written.flatMap(casts);
    expect(found.length * 1000 > lines ? found : []).toEqual([]);
  });
});

describe('comments', () => {
  // cut in two by ~, so that a search for such comments does not find these
  it.each([
    '// TO~DO: later',
    'const a = [/* FIX~ME */ 1];',
    '/** A. TO~DO. */ const a = 1;',
    'f(); // eslint~-disable-line',
    '// @ts-~ignore\nf();',
    'const a = { b: `${c}`, // @ts-~expect-error\n};',
  ])('put nothing off and silence nothing: not %s', (text) => {
    expect(commentFaults(sample(text.replace('~', '')))).toHaveLength(1);
  });

  it('keep to that', () => {
    expect(commentFaults(sample("const a = '// TO~DO';".replace('~', '')))).toEqual([]);
    expect(all.flatMap(commentFaults)).toEqual([]);
  });
});

describe('tests', () => {
  it.each(['skip', 'only', 'todo', 'fails', 'skipIf', 'runIf'])('all run: no %s', (word) => {
    const file = 'tests/x.test.ts';
    expect(leftOutTests(sample(`it.${word}('works', () => {});`, file))).toHaveLength(1);
    expect(leftOutTests(sample(`describe.each([1]).${word}('x', () => {});`, file))).toHaveLength(
      1,
    );
    expect(leftOutTests(sample(`it('x', { ${word}: true }, () => {});`, file))).toHaveLength(1);
    expect(leftOutTests(sample(`list.${word}(3); f({ ${word}: 1 });`, file))).toEqual([]);
  });

  it('keep to that', () => {
    expect(sourcesIn('tests').flatMap(leftOutTests)).toEqual([]);
  });
});
