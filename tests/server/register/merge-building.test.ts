import { describe, expect, test } from 'vitest';
import { mergeBuilding } from '../../../server/register/merge-building.ts';

type Given = { ours: string | null; base?: string | null; theirs: string | null };

function merged(
  { ours, base, theirs }: Given,
  settle: 'ask' | 'keep ours' | 'take theirs' = 'ask',
) {
  return mergeBuilding({
    ours: { use: ours },
    base: base === undefined ? {} : { use: base },
    theirs: { use: theirs },
    settle,
  });
}

describe('mergeBuilding', () => {
  test.each([
    ['nothing changed', { ours: 'a', base: 'a', theirs: 'a' }, 'same', undefined],
    ['the file changed', { ours: 'a', base: 'a', theirs: 'b' }, 'changed', false],
    ['the file has become blank', { ours: 'a', base: 'a', theirs: null }, 'changed', false],
    ['a hand changed', { ours: 'b', base: 'a', theirs: 'a' }, 'same', true],
    ['a hand cleared it', { ours: null, base: 'a', theirs: 'a' }, 'same', true],
    ['both changed alike', { ours: 'b', base: 'a', theirs: 'b' }, 'same', undefined],
    ['both changed', { ours: 'b', base: 'a', theirs: 'c' }, 'conflict', true],
    ['no file spoke of it, and it is unknown', { ours: null, theirs: 'c' }, 'changed', false],
    ['no file spoke of it, nor does this one', { ours: 'b', theirs: null }, 'same', true],
    ['no file spoke of it, and a hand filled it in', { ours: 'b', theirs: 'c' }, 'conflict', true],
  ] as const)('where %s', (_, given, outcome, isKept) => {
    const { fields, ...result } = merged(given);
    expect([result.outcome, fields[0]?.isKept]).toEqual([outcome, isKept]);
    expect(result.imported).toEqual({ use: given.theirs });
  });

  test('settles a conflict as wanted, which stays one', () => {
    const both = { ours: 'b', base: 'a', theirs: 'c' };
    const fate = (settle: 'keep ours' | 'take theirs') => merged(both, settle).fields[0];
    expect(fate('keep ours')).toMatchObject({ isKept: true, isConflict: true });
    expect(fate('take theirs')).toMatchObject({ isKept: false, isConflict: true });
    expect(merged(both, 'take theirs').outcome).toBe('conflict');
  });

  test('leaves alone what a file does not speak of', () => {
    const result = mergeBuilding({
      ours: { use: 'a', name: 'n' },
      base: { name: 'm' },
      theirs: { use: 'a' },
      settle: 'ask',
    });
    expect(result).toEqual({ outcome: 'same', fields: [], imported: { name: 'm', use: 'a' } });
  });
});
