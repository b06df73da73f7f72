import { describe, expect, it } from 'vitest';
import {
  LARGEST_SEED,
  randomNumbers,
  randomShares,
} from '../../../shared/numerics/random-numbers.ts';

function first(seed: number, count: number): number[] {
  const next = randomNumbers(seed);
  return Array.from({ length: count }, next);
}

describe('randomNumbers', () => {
  it('gives the numbers that the author of the generator prints for seed 42', () => {
    expect(first(42, 6)).toEqual([
      0xa15c02b7, 0x7b47f409, 0xba1d3330, 0x83d2f293, 0xbfa4784b, 0xcbed606e,
    ]);
  });

  it.each([0, 1, LARGEST_SEED])('takes seed %d, and gives the same again', (seed) => {
    expect(first(seed, 20)).toEqual(first(seed, 20));
    expect(first(seed, 20)).not.toEqual(first(42, 20));
  });
});

describe('randomShares', () => {
  it('are spread evenly between 0 and 1', () => {
    const next = randomShares(7);
    const shares = Array.from({ length: 10_000 }, next);
    expect(shares.every((share) => share > 0 && share < 1)).toBe(true);
    for (let tenth = 0; tenth < 10; tenth++) {
      const count = shares.filter((share) => Math.floor(10 * share) === tenth).length;
      // 1000 are expected, give or take 30; five times that is once in millions
      expect(Math.abs(count - 1000)).toBeLessThan(150);
    }
  });
});
