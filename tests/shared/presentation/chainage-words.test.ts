import { describe, expect, it } from 'vitest';
import { chainageWords } from '../../../shared/presentation/chainage-words.ts';

describe('chainageWords', () => {
  it.each([
    [0, '0+000'],
    [45, '0+045'],
    [999.4, '0+999'],
    [999.6, '1+000'],
    [2645, '2+645'],
    [12_003, '12+003'],
  ])('of %s m is %s', (metres, words) => {
    expect(chainageWords(metres)).toBe(words);
  });
});
