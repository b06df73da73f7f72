import { expect, test } from 'vitest';
import { beamStrains } from '../../../shared/building/deep-beam.ts';
import { deflectionAtStrain } from '../../../shared/building/deflection-at-strain.ts';

const BEAM = { length: 20, height: 10, eOverG: 2.6, poisson: 0.3 };
const LIMIT = 0.0015;

test.each(['sagging', 'hogging'] as const)(
  'bent so far a beam that is stretched has that strain: %s',
  (mode) => {
    for (const eOverG of [0.5, 2.6, 12.5]) {
      for (const horizontalStrain of [-0.004, -0.001, 0, 0.0007, 0.001499]) {
        const beam = { ...BEAM, eOverG };
        const ratio = deflectionAtStrain(mode, beam, horizontalStrain, LIMIT);
        const { strain } = beamStrains(mode, beam, ratio, horizontalStrain);
        expect(Math.abs(strain / LIMIT - 1)).toBeLessThan(1e-9);
      }
    }
  },
);

test.each([
  ['at the limit in tension', LIMIT],
  ['beyond it', 2 * LIMIT],
  ['where compression alone shears it so far', -LIMIT / 0.3 - 1e-6],
])('none is needed %s', (_where, horizontalStrain) => {
  expect(deflectionAtStrain('hogging', BEAM, horizontalStrain, LIMIT)).toBe(0);
});
