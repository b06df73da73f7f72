import { describe, expect, it } from 'vitest';
import { volumePerMetre } from '../../../shared/ground/volume-loss.ts';

describe('volumePerMetre', () => {
  // by hand: π/4 · 36 = 28.2743 m², of which 1 %; π/4 · 8.1² = 51.5300 m², of which 0.5 %
  it.each([
    [0.01, 6, 0.282743],
    [0.005, 8.1, 0.25765],
    [0, 6, 0],
  ])('of V_L %d and D %d m is %d m³/m', (V_L, D, wanted) => {
    // the digits written out above
    expect(volumePerMetre(V_L, D)).toBeCloseTo(wanted, 6);
  });
});
