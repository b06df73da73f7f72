import { describe, expect, it } from 'vitest';
import type { Stretch } from '../../../shared/building/curvature-runs.ts';
import { joinSlivers } from '../../../shared/building/join-slivers.ts';

/** Stretches written as 'S 0-5', 'H 5-5.3'. */
function parsed(text: string): Stretch[] {
  return text
    .split(', ')
    .filter(Boolean)
    .map((part) => {
      const [mode = '', ends = ''] = part.split(' ');
      const [start = NaN, end = NaN] = ends.split('-').map(Number);
      return { mode: mode === 'S' ? 'sagging' : 'hogging', start, end };
    });
}

function written(stretches: readonly Stretch[]): string {
  return stretches
    .map(({ mode, start, end }) => `${mode === 'sagging' ? 'S' : 'H'} ${start}-${end}`)
    .join(', ');
}

function joined(text: string, whole: Stretch['mode'] = 'hogging'): string {
  return written(joinSlivers(parsed(text), () => whole));
}

describe('joinSlivers: the method', () => {
  it.each([
    ['nothing short', 'S 0-5, H 5-9', 'S 0-5, H 5-9'],
    ['exactly 0.5 m is no sliver', 'S 0-5, H 5-5.5, S 5.5-9', 'S 0-5, H 5-5.5, S 5.5-9'],
    ['between two of one mode: joins both', 'S 0-5, H 5-5.3, S 5.3-9', 'S 0-9'],
    ['the same, however unequal they are', 'S 0-0.5, H 0.5-0.9, S 0.9-9', 'S 0-9'],
    ['at the start: joins what it touches', 'H 0-0.3, S 0.3-5', 'S 0-5'],
    ['at the end', 'S 0-5, H 5-5.4', 'S 0-5.4'],
    [
      'after a gap on one side: joins the side it touches',
      'S 0-5, H 6-6.3, S 6.3-9',
      'S 0-5, S 6-9',
    ],
    ['the same on the other side', 'S 0-5, H 5-5.3, S 6-9', 'S 0-5.3, S 6-9'],
    ['touches none: makes no zone', 'S 0-5, H 6-6.3, S 7-9', 'S 0-5, S 7-9'],
    ['touches none, alone with one zone', 'H 0-0.2, S 3-5', 'S 3-5'],
    ['two in a row: the shorter first', 'S 0-5, H 5-5.4, S 5.4-5.6, H 5.6-9', 'S 0-5, H 5-9'],
    ['two in a row: the other way', 'S 0-5, H 5-5.2, S 5.2-5.6, H 5.6-9', 'S 0-5.6, H 5.6-9'],
    ['three in a row grow to a zone', 'S 0-0.4, H 0.4-0.7, S 0.7-1.1, H 1.1-3', 'S 0-1.1, H 1.1-3'],
    ['a chain of slivers apart from a zone', 'H 0-0.3, S 0.3-0.7, H 2-4', 'S 0-0.7, H 2-4'],
  ])('%s', (_, given, wanted) => {
    expect(joined(given)).toBe(wanted);
  });

  it('joins the longer where both neighbours differ from each other', () => {
    // does not come from a wall, where modes take turns, but is the rule
    expect(joined('S 0-5, H 5-5.3, H 5.3-6')).toBe('S 0-5.3, H 5.3-6');
    expect(joined('S 0-1, S 1-1.3, H 1.3-6')).toBe('S 0-1, H 1-6');
  });

  it('all is one zone where no piece reaches 0.5 m but all together do', () => {
    expect(joined('S 0-0.3, H 0.3-0.6', 'sagging')).toBe('S 0-0.6');
    expect(joined('S 0-0.3, H 0.3-0.6', 'hogging')).toBe('H 0-0.6');
    // with a gap: from the first to the last
    expect(joined('S 0-0.3, H 2-2.3', 'hogging')).toBe('H 0-2.3');
  });

  it('asks for the mode of the whole from end to end', () => {
    const asked: number[][] = [];
    joinSlivers(parsed('S 1-1.4, H 1.4-1.8'), (start, end) => {
      asked.push([start, end]);
      return 'hogging';
    });
    expect(asked).toEqual([[1, 1.8]]);
  });

  it('under 0.5 m in all there is no zone', () => {
    expect(joined('')).toBe('');
    expect(joined('S 0-0.49')).toBe('');
    expect(joined('S 0-0.25, H 3-3.24')).toBe('');
  });

  it('leaves what it was given as it is', () => {
    const given = parsed('S 0-5, H 5-5.3, S 5.3-9');
    joinSlivers(given, () => 'hogging');
    expect(written(given)).toBe('S 0-5, H 5-5.3, S 5.3-9');
  });
});
