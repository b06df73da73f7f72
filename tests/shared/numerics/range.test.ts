import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MethodError } from '../../../shared/method-error.ts';
import {
  atPosition,
  CENTRAL,
  certain,
  FIVE_POSITIONS,
  isRange,
  positionOf,
  rangeOf,
} from '../../../shared/numerics/range.ts';
import { holds, numbers } from '../../support/property.ts';

describe('rangeOf', () => {
  it('takes low, central, high', () => {
    expect(rangeOf([0.4, 0.5, 0.6])).toEqual({ low: 0.4, central: 0.5, high: 0.6 });
  });

  it('takes one value as certain', () => {
    expect(rangeOf(0.5)).toEqual(certain(0.5));
  });

  it.each([[[2, 1, 3]], [[1, 3, 2]], [[3, 2, 1]], [[1, NaN, 2]]] as const)(
    'refuses %j by name',
    ([low, central, high]) => {
      try {
        rangeOf([low, central, high]);
        expect.unreachable();
      } catch (error) {
        expect(error).toBeInstanceOf(MethodError);
        expect(error).toMatchObject({ code: 'bad-range' });
      }
    },
  );
});

describe('isRange', () => {
  it('tells a range from a certain value', () => {
    expect(isRange(certain(1))).toBe(false);
    expect(isRange(rangeOf([1, 1, 2]))).toBe(true);
  });
});

describe('atPosition', () => {
  it('walks from low to high in five steps', () => {
    const range = rangeOf([0, 4, 10]);
    expect(FIVE_POSITIONS.map((position) => atPosition(range, position))).toEqual([0, 2, 4, 7, 10]);
  });

  it('has the central value in the middle', () => {
    expect(atPosition(rangeOf([1, 2, 9]), CENTRAL)).toBe(2);
  });

  it('never falls from one position to the next', () => {
    holds(fc.tuple(numbers(-1e3, 1e3), numbers(0, 10), numbers(0, 10)), ([low, a, b]) => {
      const range = rangeOf([low, low + a, low + a + b]);
      const values = FIVE_POSITIONS.map((position) => atPosition(range, position));
      expect([...values].sort((x, y) => x - y)).toEqual(values);
    });
  });

  it('is straight between low and central and between central and high', () => {
    const range = rangeOf([0, 4, 10]);
    expect([0.5, 1.5, 2.5, 3.75].map((position) => atPosition(range, position))).toEqual([
      1, 3, 5.5, 9.25,
    ]);
  });

  it('has the mean of two values half-way, to the last digit', () => {
    holds(fc.tuple(numbers(-1e3, 1e3), numbers(0, 10), numbers(0, 10)), ([low, a, b]) => {
      const range = rangeOf([low, low + a, low + a + b]);
      const { central, high } = range;
      expect(FIVE_POSITIONS.map((position) => atPosition(range, position) + 0)).toEqual([
        low + 0,
        (low + central) / 2 + 0,
        central + 0,
        (central + high) / 2 + 0,
        high + 0,
      ]);
    });
  });

  it('is the same everywhere where the value is certain', () => {
    for (const position of FIVE_POSITIONS) expect(atPosition(certain(0.7), position)).toBe(0.7);
  });
});

describe('positionOf', () => {
  it('finds the position of a value', () => {
    const range = rangeOf([0, 4, 10]);
    for (const position of [0, 0.5, 1.5, 2, 2.5, 4]) {
      expect(positionOf(range, atPosition(range, position))).toBeCloseTo(position, 12);
    }
  });

  it('takes the middle of a range without width', () => {
    expect(positionOf(certain(0.5), 0.5)).toBe(CENTRAL);
  });
});
