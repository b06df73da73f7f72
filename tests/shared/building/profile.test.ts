import { describe, expect, it } from 'vitest';
import { crossings } from '../../../shared/building/crossings.ts';
import { deflection } from '../../../shared/building/deflection.ts';
import {
  averageHorizontalStrain,
  peakHorizontalStrain,
} from '../../../shared/building/horizontal-strain.ts';
import { combineProfiles, type ProfileQuantity } from '../../../shared/building/profile.ts';
import { intervalOf, profileValue, shareOf } from '../../../shared/building/profile-value.ts';
import { methodErrorOf } from '../../support/method-error-of.ts';
import { profileOf } from '../../support/profile-of.ts';

/** Polynomials up to the fifth power are exact but for rounding. */
const DIGITS = 12;

describe('a profile', () => {
  // S = 1 + x − x³/10, u = x²
  const profile = profileOf(10, [1, 1, 0, -0.1], [0, 0, 1]);

  it.each<[ProfileQuantity, number, number]>([
    ['settlement', 3, 1.3],
    ['slope', 3, -1.7],
    ['curvature', 3, -1.8],
    ['displacement', 3, 9],
    ['strain', 3, 6],
    ['settlement', 0, 1],
    ['settlement', 10, -89],
    ['strain', 10, 20],
  ])('%s at %d m is %d', (quantity, x, wanted) => {
    expect(profileValue(profile, quantity, x)).toBeCloseTo(wanted, 10);
  });

  it('finds the interval and the share of the way through it', () => {
    expect([-1, 0, 2.4, 2.5, 7.5, 9.9, 10, 11].map((x) => intervalOf(profile, x))).toEqual([
      0, 0, 0, 1, 3, 3, 3, 3,
    ]);
    expect(shareOf(profile, 1, 3)).toBeCloseTo(0.2, DIGITS);
  });

  it('new-oreilly-1991: profiles add up by their factors', () => {
    const both = combineProfiles([profile, profileOf(10, [0, 0, 1])], [2, 0.5]);
    expect(profileValue(both, 'settlement', 3)).toBeCloseTo(2 * 1.3 + 4.5, DIGITS);
    expect(profileValue(both, 'displacement', 3)).toBeCloseTo(18, DIGITS);
    expect(methodErrorOf(() => combineProfiles([], [])).code).toBe('bad-table');
  });
});

describe('crossings', () => {
  // S = (x − 1)(x − 4)(x − 9) = x³ − 14x² + 49x − 36
  const cubic = profileOf(10, [-36, 49, -14, 1]);

  it('finds all, in order', () => {
    const found = crossings(cubic, 'settlement', 0, 0, 10);
    expect(found).toHaveLength(3);
    for (const [k, x] of [1, 4, 9].entries()) expect(found[k]).toBeCloseTo(x, DIGITS);
  });

  it('looks between two distances only', () => {
    expect(crossings(cubic, 'settlement', 0, 1.5, 8.5)).toHaveLength(1);
    expect(crossings(cubic, 'settlement', 0, 5, 8)).toEqual([]);
    expect(crossings(cubic, 'settlement', 0, 3, 3)).toEqual([]);
  });

  it('finds one just at a node once', () => {
    // the nodes are 0, 2.5, 5, 7.5 and 10
    const atNode = profileOf(10, [-25, 0, 1]);
    expect(crossings(atNode, 'settlement', 0, 0, 10)).toEqual([5]);
  });

  it('finds two in one interval', () => {
    // (x − 3)(x − 4)
    expect(crossings(profileOf(10, [12, -7, 1]), 'settlement', 0, 0, 10)).toHaveLength(2);
  });

  it('none where a level is only touched or never reached', () => {
    expect(crossings(profileOf(10, [1]), 'settlement', 0, 0, 10)).toEqual([]);
    expect(crossings(profileOf(10, [0]), 'curvature', 1e-8, 0, 10)).toEqual([]);
  });
});

describe('deflection: burland-wroth-1974', () => {
  it('a parabola leaves its chord by κL²/8 in the middle', () => {
    const { deflection: delta, at } = deflection(profileOf(10, [3, 2, 0.5]), 1, 9);
    expect(delta).toBeCloseTo(8, 11);
    expect(at).toBeCloseTo(5, 11);
  });

  it('takes the larger side of an S', () => {
    // x³ − 14x² + 49x − 36 between its roots: 20.2 over [1, 4] is less than 36 over [4, 9]
    const profile = profileOf(10, [-36, 49, -14, 1]);
    const { at } = deflection(profile, 1, 9);
    expect(at).toBeCloseTo(7, 11);
    expect(deflection(profile, 1, 9).deflection).toBeCloseTo(36, 10);
  });

  it('a straight line leaves it nowhere', () => {
    expect(deflection(profileOf(10, [3, 2]), 1, 9).deflection).toBeLessThan(1e-14);
  });
});

describe('horizontal strain', () => {
  // u = x³/3 − 2x²: strain x² − 4x, least −4 at 2 m
  const profile = profileOf(6, [0], [0, 0, -2, 1 / 3]);

  it('burland-1995: the average is the change of length by the length', () => {
    // u(5) = −8.3333, u(1) = −1.6667
    expect(averageHorizontalStrain(profile, 1, 5)).toBeCloseTo(-20 / 3 / 4, DIGITS);
  });

  it('the peak is the most tensile', () => {
    expect(peakHorizontalStrain(profile, 1, 5)).toBeCloseTo(5, DIGITS);
    expect(peakHorizontalStrain(profile, 0.5, 3)).toBeCloseTo(-1.75, DIGITS);
  });

  it('the peak may lie inside', () => {
    // strain 4x − x², largest 4 at 2 m
    const humped = profileOf(6, [0], [0, 0, 2, -1 / 3]);
    expect(peakHorizontalStrain(humped, 0.3, 5)).toBeCloseTo(4, DIGITS);
    expect(peakHorizontalStrain(humped, 3, 5)).toBeCloseTo(3, DIGITS);
  });
});
