import { describe, expect, test } from 'vitest';
import { packIds } from '../../../server/register/packed-ids.ts';
import {
  countsOf,
  inOrderOf,
  meantBy,
  rankedFigures,
  rankedGroups,
  rankedSizes,
} from '../../../server/register/ranked.ts';

function packed(...ids: number[]): Buffer {
  return packIds(Int32Array.from(ids));
}

function figures(...values: number[]): Buffer {
  const bytes = Buffer.alloc(values.length * 8);
  values.forEach((value, k) => bytes.writeDoubleBE(value, k * 8));
  return bytes;
}

/** By reference; 8 was not found, 6 has left the register. */
const REFERENCES = Int32Array.of(9, 4, 7, 8, 3, 5);
const FIGURES = rankedFigures(packed(3, 7, 9, 6, 5, 4), figures(-2.5, 0, 0, 1, 1e300, 1e300));
const WORDS = rankedGroups([
  { value: 'listed', ids: packed(7, 9) },
  { value: 'nobody', ids: packed() },
  { value: 'piled', ids: packed(3) },
]);

function ordered(...asked: Parameters<typeof inOrderOf>): number[] {
  return [...inOrderOf(...asked)];
}

describe('a column in order', () => {
  test('puts those alike as they came, those without a value last', () => {
    expect(ordered(FIGURES, REFERENCES, false)).toEqual([3, 9, 7, 4, 5, 8]);
    expect(ordered(WORDS, REFERENCES, false)).toEqual([9, 7, 3, 4, 8, 5]);
  });

  test('the other way round too', () => {
    expect(ordered(FIGURES, REFERENCES, true)).toEqual([4, 5, 9, 7, 3, 8]);
    expect(ordered(WORDS, REFERENCES, true)).toEqual([3, 9, 7, 4, 8, 5]);
  });

  test('is told by how many are alike as well', () => {
    const sizes = rankedSizes(packed(7, 9, 3), packed(2, 1));
    expect(ordered(sizes, REFERENCES, true)).toEqual(ordered(WORDS, REFERENCES, true));
  });

  test('of nothing leaves all as they came', () => {
    const none = rankedGroups([]);
    expect(ordered(none, REFERENCES, true)).toEqual([...REFERENCES]);
    expect(ordered(FIGURES, Int32Array.of(), false)).toEqual([]);
  });
});

describe('the values of a column', () => {
  test('are counted among some buildings, ascending, those without last', () => {
    expect(countsOf(FIGURES, REFERENCES)).toEqual([
      { value: -2.5, count: 1 },
      { value: 0, count: 2 },
      { value: 1e300, count: 2 },
      { value: null, count: 1 },
    ]);
    expect(countsOf(WORDS, [3, 3])).toEqual([{ value: 'piled', count: 2 }]);
  });

  test('say which buildings are meant', () => {
    const isDeep = meantBy(FIGURES, (value) => typeof value === 'number' && value >= 0);
    expect([...REFERENCES.filter(isDeep)]).toEqual([9, 4, 7, 5]);
    const isUnknown = meantBy(WORDS, (value) => value === null);
    expect([...REFERENCES.filter(isUnknown)]).toEqual([4, 8, 5]);
  });
});
