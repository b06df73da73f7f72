import { describe, expect, test } from 'vitest';
import { AppError } from '../../../server/errors.ts';
import { columnsBeside, splitFilter } from '../../../server/register/split-filter.ts';
import { REGISTER_ORDER, type RegisterFilter } from '../../../shared/schemas/register.ts';
import { isResultColumn } from '../../../shared/schemas/result-columns.ts';
import { isBesideColumn, isStandingColumn } from '../../../shared/schemas/standing-columns.ts';

const FILTER: RegisterFilter = {
  search: 'quay',
  any: { stage: ['3', '2', null], state: ['decided'], use: ['shop'] },
  ranges: { settlement: { from: 10 }, area: { to: 50 } },
  unknown: ['strain', 'use'],
};

function isMeant(filter: RegisterFilter, value: string | number | null): boolean[] {
  return splitFilter(filter, isBesideColumn).asked.map((asked) => asked.isMeant(value));
}

describe('a filter', () => {
  test('is split into what is asked beside buildings and the rest', () => {
    const { rest, asked } = splitFilter(FILTER, isBesideColumn);
    expect(rest).toEqual({
      search: 'quay',
      any: { use: ['shop'] },
      ranges: { area: { to: 50 } },
      unknown: ['use'],
    });
    expect(asked.map(({ column }) => column)).toEqual(['stage', 'state', 'settlement', 'strain']);
  });

  test('leaves one kind of column to the rest, and nothing empty', () => {
    const { rest, asked } = splitFilter(FILTER, isStandingColumn);
    expect(asked.map(({ column }) => column)).toEqual(['state']);
    expect(splitFilter(rest, isResultColumn).asked).toHaveLength(3);
    expect(splitFilter({ any: { stage: ['1'] } }, isResultColumn).rest).toEqual({});
  });

  test('that asks nothing beside stays as it is', () => {
    const own: RegisterFilter = { unknown: ['use'], assumed: true };
    expect(splitFilter(own, isBesideColumn)).toEqual({ rest: own, asked: [] });
  });

  test('hangs on the columns that it names and the one of the order', () => {
    const sort = { column: 'reserve', descending: true } as const;
    expect(columnsBeside({ filter: FILTER, sort })).toHaveLength(5);
    expect(columnsBeside({ filter: {}, sort })).toEqual(['reserve']);
    expect(columnsBeside({ filter: {}, sort: REGISTER_ORDER })).toEqual([]);
  });
});

describe('what is meant in a column', () => {
  test.each<[string, RegisterFilter, (string | number | null)[], (string | number | null)[]]>([
    ['numbers', { any: { stage: ['3', ' 2 ', '', 'x'] } }, [3, 2], [0, 1, null]],
    ['numbers or none', { any: { stage: ['3', null] } }, [3, null], [2]],
    ['words', { any: { settled: ['settled'] } }, ['settled'], ['sensitive', null]],
    ['from', { ranges: { strain: { from: 0.1 } } }, [0.1, 7], [0.0999, null]],
    ['to', { ranges: { strain: { to: 0.1 } } }, [0.1, -7], [0.1001, null]],
    ['a range that is open', { ranges: { strain: {} } }, [0], [null]],
    ['the unknown', { unknown: ['strain'] }, [null], [0, 1]],
    ['all together', { any: { stage: ['1', '2', null] }, ranges: { stage: { from: 2 } } }, [2], [1, 3, null]], // prettier-ignore
    ['the unknown within a range', { ranges: { stage: { from: 2 } }, unknown: ['stage'] }, [], [1, 2, null]], // prettier-ignore
  ])('is %s', (_, filter, meant, others) => {
    expect(meant.map((value) => isMeant(filter, value))).toEqual(meant.map(() => [true]));
    expect(others.map((value) => isMeant(filter, value))).toEqual(others.map(() => [false]));
  });

  test('is no range of words', () => {
    const filter: RegisterFilter = { ranges: { heldBy: { from: 1 } } };
    expect(() => splitFilter(filter, isBesideColumn)).toThrow(AppError);
  });
});
