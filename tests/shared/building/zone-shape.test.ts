import { describe, expect, it } from 'vitest';
import { governingZone, strainedZone } from '../../../shared/building/strained-zone.ts';
import { wallExtremes } from '../../../shared/building/wall-extremes.ts';
import { wallLength } from '../../../shared/building/wall.ts';
import { zoneShape, type StrainRules } from '../../../shared/building/zone-shape.ts';
import { aWall } from '../../support/builders.ts';
import { profileOf } from '../../support/profile-of.ts';

const RULES: StrainRules = { horizontalStrain: 'average', compression: 'counted' };
/** S = 25 mm − (x − 5)²/1000; u = x²/10,000 − x/1,000: strain −1e-3 to 1e-3 over 10 m. */
const profile = profileOf(10, [0, 0.01, -0.001], [0, -0.001, 1e-4]);
const ZONE = { mode: 'sagging', start: 1, end: 7 } as const;
/** Sums of a few products. */
const DIGITS = 14;

describe('zoneShape', () => {
  it('deflection of the zone from its own chord, and the average strain', () => {
    const shape = zoneShape(profile, 2, ZONE, RULES);
    expect(shape).toMatchObject(ZONE);
    // κL²/8 of 4e-3 and 6 m, in the middle
    expect(shape.deflection).toBeCloseTo(0.018, DIGITS);
    expect(shape.deflectionAt).toBeCloseTo(4, 11);
    expect(shape.deflectionRatio).toBeCloseTo(0.003, DIGITS);
    // twice (u(7) − u(1))/6
    expect(shape.horizontalStrain).toBeCloseTo((2 * (-0.0021 + 0.0009)) / 6, DIGITS);
  });

  it('the peak where that is the rule', () => {
    const peak = zoneShape(profile, 2, ZONE, { ...RULES, horizontalStrain: 'peak' });
    expect(peak.horizontalStrain).toBeCloseTo(2 * 0.0004, DIGITS);
  });

  it('no compression where that is the rule, but all tension', () => {
    const zero = { ...RULES, compression: 'zero' } as const;
    expect(zoneShape(profile, 2, ZONE, zero).horizontalStrain).toBe(0);
    const stretched = { ...ZONE, start: 6, end: 9 };
    expect(zoneShape(profile, 2, stretched, zero).horizontalStrain).toBeCloseTo(0.001, DIGITS);
  });
});

describe('strainedZone', () => {
  it('takes the length of the zone, not of the wall', () => {
    const shape = zoneShape(profile, 1, ZONE, { ...RULES, compression: 'zero' });
    const { strain, diagonalStrain } = strainedZone(shape, {
      height: 6,
      eOverG: 2.6,
      poisson: 0.3,
    });
    // Δ/L 0.0015; L/(6H) + HE/(4LG) and 1 + 2L²/(3H²)·G/E at L = H
    expect(diagonalStrain).toBeCloseTo(0.0015 / (1 + 2 / 7.8), DIGITS);
    expect(strain).toBeCloseTo(0.0015 / (1 / 6 + 0.65), DIGITS);
  });
});

describe('governingZone', () => {
  it('is the one with the largest strain, the first of equals, −1 without zones', () => {
    const zones = [0.1, 0.3, 0.2, 0.3].map((strain) => ({ strain }));
    expect(governingZone(zones)).toBe(1);
    expect(governingZone([])).toBe(-1);
    expect(governingZone([{ strain: 0 }])).toBe(0);
  });
});

describe('wallExtremes', () => {
  it('largest settlement and slope, tilt and angular distortion, by hand', () => {
    // over 8 m: S from 0 to 16 mm, tilt 2e-3; slopes from 10e-3 to −6e-3
    const eight = profileOf(8, [0, 0.01, -0.001]);
    const found = wallExtremes(eight, 1, 8);
    expect(found.settlementMax).toBeCloseTo(0.025, DIGITS);
    expect(found.settlementMaxAt).toBeCloseTo(5, 11);
    expect(found.slopeMax).toBeCloseTo(0.01, DIGITS);
    expect(found.tilt).toBeCloseTo(0.002, DIGITS);
    expect(found.angularDistortion).toBeCloseTo(0.008, DIGITS);
  });

  it('grows with the scale', () => {
    const [one, two] = [1, 2].map((scale) => wallExtremes(profile, scale, 10));
    for (const figure of ['settlementMax', 'slopeMax', 'tilt', 'angularDistortion'] as const) {
      expect(two?.[figure]).toBeCloseTo(2 * (one?.[figure] ?? NaN), DIGITS);
    }
  });

  it('finds the steepest slope at an inflexion inside', () => {
    // slope 6e-4 x (5 − x): steepest 3.75e-3 at 2.5 m, level at 0 and 5 m
    const found = wallExtremes(profileOf(5, [0, 0, 15e-4, -2e-4]), 1, 5);
    expect(found.slopeMax).toBeCloseTo(0.00375, DIGITS);
    expect(found.settlementMaxAt).toBeCloseTo(5, 6);
    // tilt 12.5 mm / 5 m
    expect(found.angularDistortion).toBeCloseTo(0.0025, DIGITS);
  });

  it('a wall that only tilts is not distorted', () => {
    const found = wallExtremes(profileOf(10, [0.01, 0.002]), 1, 10);
    expect(found.angularDistortion).toBeLessThan(1e-16);
    expect(found.settlementMaxAt).toBe(10);
  });
});

describe('wallLength', () => {
  it('is the length in plan', () => {
    expect(wallLength(aWall({ from: [1, 2], to: [4, 6] }))).toBe(5);
  });
});
