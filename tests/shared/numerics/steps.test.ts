import { describe, expect, it } from 'vitest';
import { steps } from '../../../shared/numerics/steps.ts';

describe('steps', () => {
  it.each([
    ['multiples between two values', [12, 41, 10], [20, 30, 40]],
    ['the same the other way round', [41, 12, 10], [20, 30, 40]],
    ['ends that are multiples', [-10, 10, 10], [-10, 0, 10]],
    ['an end that rounding moved past', [0.1 + 0.2, 0.6, 0.3], [0.3, 0.6]],
    ['nothing between two multiples', [11, 19, 10], []],
    ['nothing where both are the same', [20, 20, 10], []],
  ] as const)('gives %s', (_, [from, to, step], expected) => {
    const close = expected.map((value) => expect.closeTo(value, 9) as number);
    expect(steps(from, to, step)).toEqual(close);
  });
});
