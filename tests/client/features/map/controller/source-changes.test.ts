// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { sourceChanges } from '../../../../../src/features/map/controller/source-changes.ts';
import type { SourcesByName } from '../../../../../src/features/map/style/sources-of-plan.ts';

function tiles(url: string, maxzoom = 17): SourcesByName {
  return { buildings: { type: 'vector', tiles: [url], minzoom: 13, maxzoom } };
}

describe('sourceChanges', () => {
  it('leaves alone what is as it was', () => {
    expect(sourceChanges(tiles('1'), tiles('1'))).toEqual({
      removed: [],
      added: [],
      readdressed: [],
    });
  });

  it('gives tiles of another version their new address and nothing else', () => {
    expect(sourceChanges(tiles('1'), tiles('2'))).toEqual({
      removed: [],
      added: [],
      readdressed: [['buildings', ['2']]],
    });
  });

  it('makes a source anew that differs in more', () => {
    const { removed, added, readdressed } = sourceChanges(tiles('1'), tiles('1', 16));
    expect([removed, added.map(([name]) => name), readdressed]).toEqual([
      ['buildings'],
      ['buildings'],
      [],
    ]);
  });

  it('takes away what is not wanted any more', () => {
    expect(sourceChanges(tiles('1'), {}).removed).toEqual(['buildings']);
  });
});
