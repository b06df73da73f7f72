import type { KnownAttributes } from './assumed-attributes.ts';
import { stiffnessOfConstruction } from './stiffness-of-construction.ts';

/**
 * What a register holds of a building that the method works with.
 *
 * Units: heights and levels m, levels above datum. Valid: null is unknown. Source: [own].
 */
export type RegisteredAttributes = {
  readonly storeys: number | null;
  readonly eavesHeight: number | null;
  readonly groundLevel: number | null;
  readonly foundingLevel: number | null;
  readonly construction: string | null;
  readonly eOverG: number | null;
  readonly poisson: number | null;
};

/**
 * What of a building is known to the method: founding depth where ground and founding level are,
 * stiffness as given or else by construction.
 *
 * Units: m and none. Valid: a founding level at the ground or over it says nothing of a depth.
 * Source: [own].
 */
export function knownOfBuilding(building: RegisteredAttributes): KnownAttributes {
  const { storeys, eavesHeight, groundLevel, foundingLevel, construction } = building;
  const depth =
    groundLevel === null || foundingLevel === null ? undefined : groundLevel - foundingLevel;
  const stiffness = stiffnessOfConstruction(construction);
  const eOverG = building.eOverG ?? stiffness?.eOverG;
  const poisson = building.poisson ?? stiffness?.poisson;
  return {
    ...(storeys !== null && { storeys }),
    ...(eavesHeight !== null && { eavesHeight }),
    ...(depth !== undefined && depth > 0 && { foundingDepth: depth }),
    ...(eOverG !== undefined && { eOverG }),
    ...(poisson !== undefined && { poisson }),
  };
}
