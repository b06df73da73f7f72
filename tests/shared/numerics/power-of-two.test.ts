import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { powerOfTwo } from '../../../shared/numerics/power-of-two.ts';
import { holds } from '../../support/property.ts';

describe('powerOfTwo', () => {
  it.each([
    [0, 1],
    [1, 2],
    [10, 1024],
    [53, 9007199254740992],
    [-1, 0.5],
    [-10, 0.0009765625],
    [1023, 8.98846567431158e307],
    [1024, Infinity],
    [-1074, Number.MIN_VALUE],
    [-1075, 0],
  ])('of %d is %d', (exponent, expected) => {
    expect(powerOfTwo(exponent)).toBe(expected);
  });

  it('is exact: the same as the engine gives', () => {
    holds(fc.integer({ min: -1080, max: 1030 }), (exponent) => {
      expect(powerOfTwo(exponent)).toBe(2 ** exponent);
    });
  });

  it('halves when the exponent falls by one', () => {
    holds(fc.integer({ min: -1070, max: 1020 }), (exponent) => {
      expect(powerOfTwo(exponent) / 2).toBe(powerOfTwo(exponent - 1));
    });
  });
});
