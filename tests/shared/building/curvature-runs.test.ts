import { describe, expect, it } from 'vitest';
import {
  curvatureRuns,
  FLAT_CURVATURE,
  type Stretch,
} from '../../../shared/building/curvature-runs.ts';
import { profileOf } from '../../support/profile-of.ts';

/** The bent stretches of a wall of 10 m whose settlement is a polynomial, ends to a tenth of a micron. */
function runs(settlement: readonly number[], flat = FLAT_CURVATURE): [string, number, number][] {
  const round = (x: number) => Math.round(x * 1e7) / 1e7;
  return curvatureRuns(profileOf(10, settlement), flat).map(({ mode, start, end }: Stretch) => [
    mode,
    round(start),
    round(end),
  ]);
}

describe('curvatureRuns', () => {
  it('burland-wroth-1974: curvature under 0 sags, over 0 hogs', () => {
    expect(runs([0, 0, -1e-4])).toEqual([['sagging', 0, 10]]);
    expect(runs([0, 0, 1e-4])).toEqual([['hogging', 0, 10]]);
  });

  it('splits at the root of the curvature, and neighbours share that very point', () => {
    // κ = 6e-5 (x − 3)
    const profile = profileOf(10, [0, 0, -9e-5, 1e-5]);
    const [first, second, ...more] = curvatureRuns(profile, FLAT_CURVATURE);
    expect(more).toEqual([]);
    expect([first?.mode, second?.mode]).toEqual(['sagging', 'hogging']);
    // the root of a straight line to a double's digits
    expect(first?.end).toBeCloseTo(3, 12);
    expect(second?.start).toBe(first?.end);
  });

  it('splits just at a node', () => {
    // κ = 6e-5 (x − 5)
    expect(runs([0, 0, -15e-5, 1e-5])).toEqual([
      ['sagging', 0, 5],
      ['hogging', 5, 10],
    ]);
  });

  it('any number of them', () => {
    // κ = 1e-4 (x − 2)(x − 5)(x − 9) = 1e-4 (x³ − 16x² + 73x − 90)
    const curvature = [-90, 73, -16, 1].map((c) => c * 1e-4);
    const settlement = [0, 0, ...curvature.map((c, k) => c / ((k + 1) * (k + 2)))];
    expect(runs(settlement)).toEqual([
      ['sagging', 0, 2],
      ['hogging', 2, 5],
      ['sagging', 5, 9],
      ['hogging', 9, 10],
    ]);
  });

  it('there is none where all is flat: level, tilted or bent by less than 1e-8', () => {
    expect(runs([0.01])).toEqual([]);
    expect(runs([0.01, 0.002])).toEqual([]);
    expect(runs([0, 0, 4.9e-9])).toEqual([]);
    expect(runs([0, 0, 5.1e-9])).toEqual([['hogging', 0, 10]]);
  });

  it('a flat stretch at an end belongs to none', () => {
    // κ = 1e-8·(x − 2)²: flat from 1 to 3 m
    const curvature = [4, -4, 1].map((c) => c * 1e-8);
    const settlement = [0, 0, ...curvature.map((c, k) => c / ((k + 1) * (k + 2)))];
    expect(runs(settlement)).toEqual([
      ['hogging', 0, 1],
      ['hogging', 3, 10],
    ]);
    // κ = 1e-9 x
    expect(runs([0, 0, 0, 1e-9 / 6], 5e-9)).toEqual([['hogging', 5, 10]]);
  });

  it('bends on over a flat stretch shorter than 0.5 m', () => {
    // κ = 1e-6·(x − 2)²: flat for 0.2 m
    const curvature = [4, -4, 1].map((c) => c * 1e-6);
    const settlement = [0, 0, ...curvature.map((c, k) => c / ((k + 1) * (k + 2)))];
    expect(runs(settlement)).toEqual([['hogging', 0, 10]]);
  });

  it('turns at the root in a flat stretch shorter than 0.5 m, and leaves a longer one out', () => {
    // κ = 4.1e-8 (x − 5): flat for 0.488 m; κ = 3.9e-8 (x − 5): for 0.513 m
    expect(runs([0, 0, -4.1e-8 * 2.5, 4.1e-8 / 6])).toEqual([
      ['sagging', 0, 5],
      ['hogging', 5, 10],
    ]);
    const [first, second] = runs([0, 0, -3.9e-8 * 2.5, 3.9e-8 / 6]);
    expect(first?.[2]).toBeCloseTo(5 - 1 / 3.9, 6);
    expect(second?.[1]).toBeCloseTo(5 + 1 / 3.9, 6);
  });
});
