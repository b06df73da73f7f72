// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { metresWide, pixelsPerMetre } from '../../../../../src/features/map/style/metres-wide.ts';

describe('pixelsPerMetre', () => {
  it('puts the whole equator on one tile of 512 pixels at zoom 0', () => {
    expect(pixelsPerMetre(0, 0) * 40_075_016.686).toBeCloseTo(512, 9);
  });

  it('doubles with every zoom and grows towards the poles as the map stretches', () => {
    expect(pixelsPerMetre(15, 54.7) / pixelsPerMetre(14, 54.7)).toBeCloseTo(2, 12);
    expect(pixelsPerMetre(14, 60) / pixelsPerMetre(14, 0)).toBeCloseTo(2, 9);
  });
});

describe('metresWide', () => {
  it('grows twofold from zoom to zoom between two of them', () => {
    const [kind, base, , far, , near] = metresWide(8, 54.7);
    expect([kind, base, far, near]).toEqual(['interpolate', ['exponential', 2], 10, 24]);
  });

  it('adds pixels to metres at both ends', () => {
    const [, , , , atFar, , atNear] = metresWide(['get', 'width'], 54.7, 1.4);
    expect(atFar).toEqual(['+', 1.4, ['*', ['get', 'width'], pixelsPerMetre(10, 54.7)]]);
    expect(atNear).toEqual(['+', 1.4, ['*', ['get', 'width'], pixelsPerMetre(24, 54.7)]]);
  });
});
