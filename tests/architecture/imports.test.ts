import { describe, expect, it } from 'vitest';
import { importsOf, type Import } from '../support/imports.ts';
import { parsed, sourcesIn } from '../support/source-files.ts';
import { cyclesOf } from './cycles.ts';
import { orderFaults } from './order.ts';
import { roomFaults, startFaults } from './rooms.ts';

function importsFrom(file: string, text: string): Import[] {
  return importsOf(parsed(file, text));
}

const real = sourcesIn('shared', 'server', 'src', 'scripts', 'tests').flatMap(importsOf);

describe('importsOf', () => {
  it('sees every way of importing', () => {
    const text = `
      import { a } from './a.ts';
      import type { B } from './b.ts';
      import { type C } from '@x/c/deep.ts';
      import './side.ts';
      export * from '../d.ts';
      type E = import('./e.ts').E;
      const f = await import('node:fs');`;
    const seen = importsFrom('shared/units/x.ts', text).map(
      (one) => `${one.target ?? one.package ?? ''} ${one.typeOnly ? 'type' : ''}`,
    );
    expect(seen).toEqual([
      'shared/units/a.ts ',
      'shared/units/b.ts type',
      '@x/c type',
      'shared/units/side.ts ',
      'shared/d.ts ',
      'shared/units/e.ts type',
      'node:fs ',
    ]);
  });
});

describe('the rooms', () => {
  it.each([
    ['shared/units/x.ts', '../../server/app.ts'],
    ['shared/units/x.ts', 'node:fs'],
    ['shared/units/x.ts', 'react'],
    ['shared/units/x.ts', '../../package.json'],
    ['shared/units/x.ts', './without-extension'],
    ['server/app.ts', '../src/main.tsx'],
    ['server/app.ts', '../scripts/start.mjs'],
    ['src/main.tsx', '../server/app.ts'],
    ['src/main.tsx', '../tests/support/x.ts'],
    ['scripts/assess/assess.ts', '../../src/main.tsx'],
    ['scripts/assess/assess.ts', '../../tests/support/x.ts'],
  ])('%s may not import %s', (file, specifier) => {
    expect(roomFaults(importsFrom(file, `import '${specifier}';`))).toHaveLength(1);
  });

  it('are kept', () => {
    expect(roomFaults(real)).toEqual([]);
  });

  it.each(['esbuild', '../shared/units/x.ts', './assess/assess.ts'])(
    'a script that runs before packages are there may not import %s at once',
    (specifier) => {
      expect(startFaults(importsFrom('scripts/x.mjs', `import '${specifier}';`))).toHaveLength(1);
      expect(startFaults(importsFrom('scripts/x.mjs', `await import('${specifier}');`))).toEqual(
        [],
      );
    },
  );

  it('are entered by scripts that need no package to start', () => {
    expect(startFaults(real)).toEqual([]);
  });
});

describe('the order inside shared', () => {
  it.each([
    ['units/x.ts', '../numerics/at.ts'],
    ['numerics/x.ts', '../geometry/point.ts'],
    ['geometry/x.ts', '../ground/piece.ts'],
    ['ground/x.ts', '../building/wall.ts'],
    ['building/x.ts', '../ground/piece.ts'],
    ['damage/x.ts', '../building/wall.ts'],
    ['building/x.ts', '../assessment/rules.ts'],
    ['monitoring/x.ts', '../assessment/rules.ts'],
    ['assessment/x.ts', '../monitoring/x.ts'],
    ['assessment/x.ts', '../checks/check.ts'],
    ['schemas/x.ts', '../ground/piece.ts'],
    ['ground/x.ts', '../schemas/limits.ts'],
    ['ground/x.ts', 'zod'],
    ['warnings.ts', './units/quantity.ts'],
    ['unheard-of/x.ts', '../units/quantity.ts'],
    ['unheard-of/deep/x.ts', '../../warnings.ts'],
  ])('%s may not import %s, not even types', (file, specifier) => {
    const text = `import type { X } from '${specifier}';`;
    expect(orderFaults(importsFrom(`shared/${file}`, text))).toHaveLength(1);
  });

  it('lets assessment know the types of schemas and nothing else of them', () => {
    const file = 'shared/assessment/x.ts';
    const types = `import type { X } from '../schemas/x.ts';`;
    expect(orderFaults(importsFrom(file, types))).toEqual([]);
    expect(orderFaults(importsFrom(file, `import '../schemas/x.ts';`))).toHaveLength(1);
  });

  it('is kept', () => {
    expect(orderFaults(real)).toEqual([]);
  });
});

describe('cycles', () => {
  it('are found, through types too', () => {
    const imports = [
      ...importsFrom('shared/a.ts', `import './b.ts';`),
      ...importsFrom('shared/b.ts', `import type { C } from './c.ts'; import './d.ts';`),
      ...importsFrom('shared/c.ts', `export * from './b.ts';`),
    ];
    expect(cyclesOf(imports)).toEqual(['shared/b.ts → shared/c.ts → shared/b.ts']);
  });

  it('are nowhere', () => {
    expect(cyclesOf(real)).toEqual([]);
  });
});
