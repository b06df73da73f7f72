import { describe, expect, it } from 'vitest';
import { doneWords, lineWords } from '../../../../src/features/register/bulk-summary.ts';
import { withBeside, withColumn, without } from '../../../../src/features/register/filter-parts.ts';
import { partLabel, partWords } from '../../../../src/features/register/filter-words.ts';
import {
  readWhich,
  withFilter,
  withSort,
} from '../../../../src/features/register/register-address.ts';

const OUTLINE: [number, number][] = [[3, 54], [3.01, 54], [3.01, 54.01]]; // prettier-ignore

describe('the parts of a filter', () => {
  it('come and go without leaving anything behind', () => {
    const one = withColumn({}, 'use', { any: ['terrace', null] });
    const two = withColumn(one, 'eavesHeight', { range: { from: 3, to: undefined } });
    expect(two).toEqual({
      any: { use: ['terrace', null] },
      ranges: { eavesHeight: { from: 3 } },
    });
    expect(JSON.stringify(without(without(two, 'use'), 'eavesHeight'))).toBe('{}');
    expect(withBeside(withBeside({}, { search: 'net' }), { search: undefined })).toEqual({});
    expect(without(withBeside({ assumed: true }, { inside: OUTLINE }), 'inside')).toEqual({
      assumed: true,
    });
    expect(withColumn({}, 'storeys', { unknown: true })).toEqual({ unknown: ['storeys'] });
  });

  it('are said in words', () => {
    const range = (from?: number, to?: number) =>
      partWords({ ranges: { eavesHeight: { from, to } } }, 'eavesHeight');
    expect(range(3, 8)).toBe('3 to 8 m');
    expect(range(3)).toBe('from 3 m');
    expect(range(undefined, 8)).toBe('up to 8 m');
    expect(partWords({ any: { use: ['a', 'b', 'c', null] } }, 'use')).toBe('a, b and 2 more');
    expect(partWords({ unknown: ['storeys'] }, 'storeys')).toBe('not known');
    expect(partWords({ assumed: false }, 'assumed')).toBe('none');
    expect(partWords({}, 'condition')).toBe('any');
    expect([partLabel('inside'), partWords({ inside: OUTLINE }, 'inside')]).toEqual([
      'Inside',
      'the outline drawn',
    ]);
  });
});

describe('the address of the register', () => {
  it('says the filter and the order, and reads them again', () => {
    const filter = { any: { use: ['church'] }, search: 'st & co', inside: OUTLINE };
    const sort = { column: 'area', descending: true } as const;
    const search = withSort(withFilter(new URLSearchParams('building=3'), filter), sort);
    expect(readWhich(new URLSearchParams(search.toString()))).toEqual({ filter, sort });
    expect(search.get('building')).toBe('3');
  });

  it.each(['filter={', 'filter={"any":{"nothing":[1]}}', 'filter=[]&sort=-nothing'])(
    'takes no nonsense: %s',
    (words) => {
      expect(readWhich(new URLSearchParams(words))).toEqual({
        filter: {},
        sort: { column: 'reference', descending: false },
      });
    },
  );
});

describe('setting values for many', () => {
  it('says what it means and what was done', () => {
    const line = { field: 'construction', value: 'masonry', same: 20, unknown: 11 } as const;
    expect(lineWords(line, 43)).toBe(
      'Set construction to masonry for 43 buildings; 12 of them have another value now.',
    );
    expect(lineWords({ ...line, same: 43, unknown: 0 }, 43)).toContain('all have it already');
    expect(doneWords({ eOverG: 12.5, condition: null }, 1)).toBe(
      'E/G set to 12.5, condition set to not known for 1 building.',
    );
  });
});
