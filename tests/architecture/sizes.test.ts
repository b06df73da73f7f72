import { describe, expect, it } from 'vitest';
import { parsed, sourcesIn } from '../support/source-files.ts';
import { fileSize, functionSizes, sizeFaults } from './sizes.ts';

const FILES = { median: 60, p90: 150, largest: 300 };
const FUNCTIONS = { median: 15, p90: 40, largest: 60 };
/** The innermost loop of everything: cut into calls it takes half as long again. */
const KERNEL = 'shared/ground/kernel.ts';

describe('sizeFaults', () => {
  function sizes(...lines: number[]) {
    return lines.map((count, index) => ({ name: `file ${index}`, lines: count }));
  }

  it('names what is longer than anything may be', () => {
    expect(sizeFaults(sizes(...Array<number>(20).fill(10), 301), FILES)).toEqual([
      'file 20 has 301 lines, at most 300',
    ]);
  });

  it('weighs the middle and nine in ten', () => {
    expect(sizeFaults(sizes(10, 61, 61), FILES)).toHaveLength(1);
    expect(sizeFaults(sizes(10, 10, 10, 10, 10, 10, 10, 10, 151, 151), FILES)).toHaveLength(1);
    expect(sizeFaults(sizes(10, 10, 10, 10, 10, 10, 10, 10, 10, 300), FILES)).toEqual([]);
  });

  it('counts plain lines of files and named functions', () => {
    const text = `// one\n\n/** two */\nfunction f(): void {\n  g(() => {\n  });\n}\nconst h = () => 1;\n`;
    const file = parsed('shared/x.ts', text);
    expect(fileSize(file)).toEqual({ name: 'shared/x.ts', lines: 8 });
    expect(functionSizes(file)).toEqual([
      { name: 'shared/x.ts:4', lines: 4 },
      { name: 'shared/x.ts:8', lines: 1 },
    ]);
  });
});

describe.each(['shared', 'server', 'src'])('the sizes in %s', (room) => {
  const sources = sourcesIn(room);

  it('of files are small', () => {
    expect(sizeFaults(sources.map(fileSize), FILES)).toEqual([]);
  });

  it('of functions are smaller', () => {
    const others = sources.filter(({ path }) => path !== KERNEL);
    expect(sizeFaults(others.flatMap(functionSizes), FUNCTIONS)).toEqual([]);
  });
});
