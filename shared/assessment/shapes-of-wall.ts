import type { CutOff } from '../building/cut-off.ts';
import { beamStrains } from '../building/deep-beam.ts';
import type { Wall } from '../building/wall.ts';
import { zoneShape, type StrainRules, type ZoneShape } from '../building/zone-shape.ts';
import { zonesOfWall } from '../building/zones.ts';
import type { LoadedProfile } from './loaded-profile.ts';

/**
 * The zones of a wall under a loaded profile, before E/G comes in.
 *
 * Units: m and m/m. Valid: any loaded profile; none where the wall is not affected.
 * Source: mair-taylor-burland-1996, burland-1995.
 */
export function shapesOfWall(
  { profile, scale }: LoadedProfile,
  cutOff: CutOff,
  rules: StrainRules,
): ZoneShape[] {
  return zonesOfWall(profile, scale, cutOff).map((zone) => zoneShape(profile, scale, zone, rules));
}

/**
 * The largest strain of a wall with given zones at one E/G, 0 without zones.
 *
 * Units: m/m. Valid: eOverG > 0. Source: burland-1995.
 */
export function largestStrain(
  shapes: readonly ZoneShape[],
  { height, poisson }: Pick<Wall, 'height' | 'poisson'>,
  eOverG: number,
): number {
  let largest = 0;
  for (const { mode, start, end, deflectionRatio, horizontalStrain } of shapes) {
    const beam = { length: end - start, height, eOverG, poisson };
    largest = Math.max(largest, beamStrains(mode, beam, deflectionRatio, horizontalStrain).strain);
  }
  return largest;
}
