import { describe, expect, it } from 'vitest';
import {
  beamSection,
  beamStrains,
  deflectionPerStrain,
  type DeepBeam,
} from '../../../shared/building/deep-beam.ts';
import { holds, numbers } from '../../support/property.ts';
import fc from 'fast-check';

const masonry: DeepBeam = { length: 20, height: 10, eOverG: 2.6, poisson: 0.3 };
/** A few products: the last digits. */
const DIGITS = 12;

describe('beamSection: burland-wroth-1974', () => {
  it('sagging: axis at mid-height', () => {
    const { I, t } = beamSection('sagging', 6);
    expect([I, t]).toEqual([18, 3]);
  });

  it('hogging: axis at the base', () => {
    const { I, t } = beamSection('hogging', 6);
    expect([I, t]).toEqual([72, 6]);
  });
});

describe('deflectionPerStrain by hand: L 20 m, H 10 m, E/G 2.6', () => {
  it('sagging', () => {
    const { bending, diagonal } = deflectionPerStrain('sagging', masonry);
    // 20/60 + 250·2.6/2000 and 1 + 4000/(1500·2.6)
    expect(bending).toBeCloseTo(0.3333333333333 + 0.325, DIGITS);
    expect(diagonal).toBeCloseTo(1 + 4000 / 3900, DIGITS);
  });

  it('hogging', () => {
    const { bending, diagonal } = deflectionPerStrain('hogging', masonry);
    // 20/120 + 1000·2.6/4000 and 1 + 4000/(6000·2.6)
    expect(bending).toBeCloseTo(0.1666666666667 + 0.65, DIGITS);
    expect(diagonal).toBeCloseTo(1 + 4000 / 15600, DIGITS);
  });

  it.each([
    ['sagging', 2.6 / 4],
    ['hogging', 2.6 / 2],
  ] as const)(
    '%s: bending takes over from shear at L/H of (E/G)/4 and (E/G)/2: %d',
    (mode, slender) => {
      const beam = { ...masonry, length: 10 * slender };
      const { bending, diagonal } = deflectionPerStrain(mode, beam);
      expect(bending).toBeCloseTo(diagonal, DIGITS);
      const longer = deflectionPerStrain(mode, { ...beam, length: 1.01 * beam.length });
      expect(longer.bending).toBeLessThan(longer.diagonal);
    },
  );
});

describe('beamStrains by hand: burland-1995', () => {
  it('without horizontal strain the ratio over each factor', () => {
    const found = beamStrains('hogging', masonry, 0.001, 0);
    expect(found.bendingStrain).toBeCloseTo(0.001 / 0.8166666666667, DIGITS);
    expect(found.diagonalStrain).toBeCloseTo(0.001 / (1 + 4000 / 15600), DIGITS);
    expect(found.governing).toBe('bending');
    expect(found.strain).toBe(found.bendingStrain);
  });

  it('tension adds to bending and, by the circle of Mohr, to shear', () => {
    const found = beamStrains('hogging', masonry, 0.001, 0.0004);
    const shear = 0.001 / (1 + 4000 / 15600);
    expect(found.bendingStrain).toBeCloseTo(0.001 / 0.8166666666667 + 0.0004, DIGITS);
    expect(found.diagonalStrain).toBeCloseTo(0.00014 + Math.hypot(0.00026, shear), DIGITS);
  });

  it('compression keeps its sign and relieves both', () => {
    const found = beamStrains('sagging', masonry, 0.001, -0.002);
    expect(found.bendingStrain).toBeLessThan(0);
    expect(found.governing).toBe('diagonal');
    const shear = 0.001 / (1 + 4000 / 3900);
    expect(found.strain).toBeCloseTo(-0.0007 + Math.hypot(0.0013, shear), DIGITS);
  });

  it('stretched alone: the strain is the stretch; pressed alone: ν of the pressure', () => {
    expect(beamStrains('hogging', masonry, 0, 0.001).strain).toBeCloseTo(0.001, DIGITS);
    expect(beamStrains('hogging', masonry, 0, -0.001).strain).toBeCloseTo(0.0003, DIGITS);
  });

  it('nothing strains nothing', () => {
    expect(beamStrains('sagging', masonry, 0, 0)).toMatchObject({
      strain: 0,
      governing: 'diagonal',
    });
  });

  it('grows with the deflection ratio and with tension', () => {
    const cases = fc.record({
      length: numbers(0.5, 60),
      height: numbers(1, 60),
      eOverG: numbers(0.1, 50),
      poisson: numbers(0, 0.5),
      ratio: numbers(0, 0.01),
      stretch: numbers(-0.005, 0.005),
    });
    holds(cases, ({ ratio, stretch, ...beam }) => {
      for (const mode of ['sagging', 'hogging'] as const) {
        const { strain } = beamStrains(mode, beam, ratio, stretch);
        expect(strain).toBeGreaterThanOrEqual(0);
        // rounding of a sum of two terms
        const least = strain - 1e-16;
        expect(beamStrains(mode, beam, ratio * 1.1, stretch).strain).toBeGreaterThanOrEqual(least);
        if (stretch < 0) continue;
        const more = beamStrains(mode, beam, ratio, stretch + 1e-4);
        expect(more.strain).toBeGreaterThanOrEqual(least);
      }
    });
  });
});
