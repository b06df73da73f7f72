import type { Recorder } from '../working.ts';
import { beamStrains, type BeamStrains, type DeepBeam } from './deep-beam.ts';
import type { ZoneShape } from './zone-shape.ts';

/**
 * A zone with its strains.
 *
 * Units: m and m/m. Valid: finite. Source: burland-1995.
 */
export type StrainedZone = ZoneShape & BeamStrains;

/**
 * The strains of a zone of given shape in a wall of given height, E/G and Poisson's ratio.
 *
 * Units: m and m/m. Valid: height > 0, eOverG > 0. Source: burland-wroth-1974, burland-1995.
 */
export function strainedZone(
  shape: ZoneShape,
  wall: Omit<DeepBeam, 'length'>,
  record?: Recorder,
): StrainedZone {
  const { height, eOverG, poisson } = wall;
  const beam = { length: shape.end - shape.start, height, eOverG, poisson };
  const strains = beamStrains(
    shape.mode,
    beam,
    shape.deflectionRatio,
    shape.horizontalStrain,
    record,
  );
  return { ...shape, ...strains };
}

/**
 * The index of the zone with the largest strain, −1 where there is none. The first of equals governs.
 *
 * Units: none. Valid: any zones. Source: [own].
 */
export function governingZone(zones: readonly { readonly strain: number }[]): number {
  let governing = -1;
  let largest = -Infinity;
  for (const [index, { strain }] of zones.entries()) {
    if (strain > largest) {
      largest = strain;
      governing = index;
    }
  }
  return governing;
}
