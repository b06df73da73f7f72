import { describe, expect, it } from 'vitest';
import { trimmed, type CutOff } from '../../../shared/building/cut-off.ts';
import { zonesOfWall } from '../../../shared/building/zones.ts';
import { profileOf } from '../../support/profile-of.ts';

/** Hogging all along 10 m: S = (x − 5)²/1000, from 25 mm at the ends to 0 in the middle. */
const dip = profileOf(10, [0.025, -0.01, 0.001]);
/** Sagging all along: S = 25 mm in the middle, 0 at the ends. */
const hump = profileOf(10, [0, 0.01, -0.001]);

function below(settlement: number): CutOff {
  return { kind: 'settlement', settlement };
}

function within(...stretches: [number, number][]): CutOff {
  return { kind: 'stretches', stretches };
}

/** Ends as roots of a square: twelve digits. */
function expectEnds(found: { start: number; end: number } | undefined, from: number, to: number) {
  expect(found?.start).toBeCloseTo(from, 10);
  expect(found?.end).toBeCloseTo(to, 10);
}

describe('trimmed: what the cut-off ignores at the two ends', () => {
  const whole = { mode: 'sagging', start: 0, end: 10 } as const;

  it('settlement under the cut-off', () => {
    // 9 mm at 1 and 9 m
    expectEnds(trimmed(hump, whole, below(0.009)), 1, 9);
    expectEnds(trimmed(hump, { ...whole, start: 0.5, end: 4 }, below(0.009)), 1, 4);
  });

  it('nothing at a cut-off of 0', () => {
    expect(trimmed(hump, whole, below(0))).toEqual(whole);
  });

  it('all where nothing settles enough', () => {
    expect(trimmed(hump, whole, below(0.026))).toBeUndefined();
    expect(trimmed(hump, { ...whole, end: 0.9 }, below(0.009))).toBeUndefined();
  });

  it('a dip under it inside stays in', () => {
    expect(trimmed(dip, { ...whole, mode: 'hogging' }, below(0.009))).toEqual({
      mode: 'hogging',
      start: 0,
      end: 10,
    });
  });

  it('one end may be cut while the dip stays', () => {
    // S = x (x − 4)² / 1000 is 0 at 4 m and passes 3 mm at (5 ± √21)/2 and 3 m
    const wavy = profileOf(6, [0, 0.016, -0.008, 0.001]);
    const found = trimmed(wavy, { mode: 'hogging', start: 0, end: 6 }, below(0.003));
    expectEnds(found, (5 - Math.sqrt(21)) / 2, 6);
  });

  it('mair-taylor-burland-1996: what lies outside given stretches', () => {
    expectEnds(trimmed(hump, whole, within([2, 5], [4, 7])), 2, 7);
    expectEnds(trimmed(hump, whole, within([-3, 1], [8, 99])), 0, 10);
    expect(trimmed(hump, whole, within([-3, 0], [10, 12]))).toBeUndefined();
    expect(trimmed(hump, whole, within())).toBeUndefined();
  });
});

describe('zonesOfWall', () => {
  /** κ = 6e-4 (x − 3), S from 30 mm: sagging to 3 m, then hogging. */
  const turning = profileOf(10, [0.03, 0.001, -9e-4, 1e-4]);

  function modes(profile: typeof turning, scale: number, cutOff = below(0)) {
    return zonesOfWall(profile, scale, cutOff).map(({ mode, start, end }) => [
      mode,
      Math.round(start * 1e6) / 1e6,
      Math.round(end * 1e6) / 1e6,
    ]);
  }

  it('splits, and leaves nothing out at a cut-off of 0', () => {
    expect(modes(turning, 1)).toEqual([
      ['sagging', 0, 3],
      ['hogging', 3, 10],
    ]);
  });

  it('multiplies settlement and curvature by the scale before they are compared', () => {
    expect(modes(hump, 1, below(0.009))).toEqual([['sagging', 1, 9]]);
    expect(modes(hump, 0.5, below(0.0045))).toEqual([['sagging', 1, 9]]);
    expect(modes(hump, 0.36, below(0.009))).toEqual([]);
    // κ of 2e-3 is flat at a scale under 5e-6
    expect(modes(hump, 4.9e-6)).toEqual([]);
    expect(modes(hump, 5.1e-6)).toEqual([['sagging', 0, 10]]);
  });

  it('nothing at a scale of 0', () => {
    expect(modes(hump, 0)).toEqual([]);
  });

  it('a sliver joins its neighbour', () => {
    // κ = 6e-4 (x − 0.3)
    expect(modes(profileOf(10, [0.03, 0.001, -9e-5, 1e-4]), 1)).toEqual([['hogging', 0, 10]]);
  });

  it('a wall whose pieces are all slivers is one zone of the sign of its mean curvature', () => {
    // 0.8 m long, κ changes sign at 0.35 m: the mean is that of the middle, 0.4 m
    const short = profileOf(0.8, [0.03, 0, -0.35e-3, 1e-3 / 3]);
    expect(modes(short, 1)).toEqual([['hogging', 0, 0.8]]);
    expect(modes(profileOf(0.8, [0.03, 0, -0.45e-3, 1e-3 / 3]), 1)).toEqual([['sagging', 0, 0.8]]);
  });

  it('a wall under 0.5 m has none', () => {
    expect(modes(profileOf(0.499, [0.03, 0, 1e-3]), 1)).toEqual([]);
    expect(modes(profileOf(0.501, [0.03, 0, 1e-3]), 1)).toEqual([['hogging', 0, 0.501]]);
  });
});
