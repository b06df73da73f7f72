import { describe, expect, it } from 'vitest';
import { REFERENCES } from '../../shared/references.ts';
import { parsed, sourcesIn } from '../support/source-files.ts';
import { docFaults } from './doc-blocks.ts';
import { exportsOf } from './exports.ts';

const GOOD = 'The length of a wall. Units: m. Valid: any wall. Source: [own].';

function faultsOf(text: string): string[] {
  const known = { references: ['burland-1995'], names: ['wallLength'] };
  return docFaults(exportsOf(parsed('shared/x.ts', text)), known);
}

function faultsOfSource(source: string): string[] {
  return faultsOf(`/** ${GOOD.replace('[own].', source)} */\nexport const a = 1;`);
}

describe('docFaults', () => {
  it.each([
    'export function f(): void {}',
    'export const a = 1;',
    'export type T = number;',
    'export class C {}',
    `export { a } from './a.ts';`,
    `export * from './a.ts';`,
  ])('asks for a block before %s', (statement) => {
    expect(faultsOf(statement)).toHaveLength(1);
    expect(faultsOf(`// ${GOOD}\n${statement}`)).toHaveLength(1);
    expect(faultsOf(`/** ${GOOD} */\n\n${statement}`)).toHaveLength(1);
    expect(faultsOf(`/** ${GOOD} */\n${statement}`)).toEqual([]);
  });

  it('asks nothing of what stays inside', () => {
    expect(faultsOf('const a = 1; function f(): void {}')).toEqual([]);
  });

  it.each([
    GOOD.replace('Units: m. ', ''),
    GOOD.replace('Valid: any wall. ', ''),
    GOOD.replace('Source: [own].', ''),
    GOOD.replace('Units: m. Valid: any wall.', 'Valid: any wall. Units: m.'),
    GOOD.replace('The length of a wall. ', ''),
    GOOD.replace('Units: m.', 'Units:'),
    `${GOOD} Source: [common].`,
  ])('finds fault with "%s"', (block) => {
    expect(faultsOf(`/** ${block} */\nexport const a = 1;`)).not.toEqual([]);
  });

  it.each(['burland-1999.', '[our] own.', 'the works themselves.', 'as `unheardOf`.', 'Burland.'])(
    'does not take "%s" for a source',
    (source) => {
      expect(faultsOfSource(source)).toHaveLength(1);
    },
  );

  it.each(['burland-1995, (4).', '[common], for 1 mm.', 'as `wallLength`.', 'see the parts.'])(
    'takes "%s" for a source',
    (source) => {
      expect(faultsOfSource(source)).toEqual([]);
    },
  );
});

describe('the doc blocks of shared', () => {
  const exports = sourcesIn('shared').flatMap(exportsOf);

  it('give meaning, units, validity and source of every export', () => {
    const known = {
      references: Object.keys(REFERENCES),
      names: exports.flatMap(({ names }) => names),
    };
    expect(docFaults(exports, known)).toEqual([]);
  });
});
