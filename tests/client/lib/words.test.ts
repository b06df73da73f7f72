// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { changesBetween } from '../../../src/lib/changes-between.ts';
import { formatDaySince, formatMoment, formatWeekday } from '../../../src/lib/format-date.ts';
import { countInWords } from '../../../src/lib/number-words.ts';

const NOW = new Date(2026, 4, 21, 9, 30);

describe('countInWords', () => {
  it('has words for small counts', () => {
    expect([0, 2, 12, 13].map(countInWords)).toEqual(['no', 'two', 'twelve', '13']);
  });
});

describe('formatDaySince', () => {
  it.each([
    [new Date(2026, 4, 21, 0, 1), 'today'],
    [new Date(2026, 4, 20, 23, 59), 'yesterday'],
    [new Date(2026, 4, 15, 12, 0), 'Friday'],
    [new Date(2026, 4, 14, 12, 0), '14 May'],
    [new Date(2025, 11, 31), '31 December 2025'],
    [new Date(2026, 4, 22), '22 May'],
  ])('%s is %s', (at, words) => {
    expect(formatDaySince(at, NOW)).toBe(words);
  });
});

describe('days and moments', () => {
  it('are written as people read them', () => {
    expect(formatWeekday(NOW)).toBe('Thursday 21 May');
    expect(formatMoment(NOW)).toBe('21 May 2026, 09:30');
  });
});

describe('changesBetween', () => {
  it('finds what differs, however deep, and nothing else', () => {
    const before = { name: 'A', rules: { cutOff: { value: 0.001 } }, same: true };
    const after = { name: 'B', rules: { cutOff: { value: 0.002 } }, same: true };
    expect(changesBetween(before, after)).toEqual([
      { path: 'name', before: 'A', after: 'B' },
      { path: 'rules cutOff value', before: '0.001', after: '0.002' },
    ]);
  });

  it('writes lists in one line, and lists of things thing by thing', () => {
    const after = {
      roles: ['designer', 'witness'],
      holds: [{ name: 'piled' }],
      none: [],
      gone: null,
    };
    expect(changesBetween(null, after)).toEqual([
      { path: 'roles', before: undefined, after: 'designer, witness' },
      { path: 'holds 1 name', before: undefined, after: 'piled' },
      { path: 'none', before: undefined, after: 'none' },
      { path: 'gone', before: undefined, after: 'none' },
    ]);
  });

  it('finds nothing between nothing and nothing', () => {
    expect(changesBetween(null, null)).toEqual([]);
    expect(changesBetween({}, {})).toEqual([]);
  });

  it('says what is empty and what is not set', () => {
    expect(changesBetween({ description: '', archived: false }, null)).toEqual([
      { path: 'description', before: 'empty', after: undefined },
      { path: 'archived', before: 'no', after: undefined },
    ]);
  });
});
