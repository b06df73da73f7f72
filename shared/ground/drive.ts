import type { Range } from '../numerics/range.ts';
import type { SpacePoint } from '../geometry/point.ts';

/**
 * What holds along a length of a drive: excavated diameter, volume loss and trough width parameter.
 *
 * Units: diameter m, volumeLoss m/m, troughWidth K without unit. Valid: diameter > 0, volumeLoss ≥ 0.
 * Source: [own].
 */
export type DriveInputs = {
  readonly diameter: number;
  readonly volumeLoss: Range;
  readonly troughWidth: Range;
};

/**
 * An interval of chainage with inputs of its own; what it leaves out is the drive's.
 *
 * Units: from and to in m of chainage. Valid: from < to; intervals of a drive do not overlap.
 * Source: [own].
 */
export type DriveInterval = Partial<DriveInputs> & { readonly from: number; readonly to: number };

/**
 * The ground level over a drive at one chainage.
 *
 * Units: m of chainage, m above datum. Valid: rows in order of chainage; straight between them.
 * Source: [own].
 */
export type GroundLevelRow = { readonly chainage: number; readonly level: number };

/**
 * One bore, driven along its axis in the order of its points; chainage is plan length from the first.
 *
 * Units: axis m; faceShare is the share of the final settlement that has happened above the face;
 * laterFactor multiplies the volume loss of a drive that follows another. Valid: 0 < faceShare < 1,
 * 1 ≤ laterFactor ≤ 1.6 [common]. Source: mair-taylor-1997 (face share), new-oreilly-1991 (several
 * drives).
 */
export type Drive = DriveInputs & {
  readonly name: string;
  readonly axis: readonly SpacePoint[];
  readonly intervals: readonly DriveInterval[];
  readonly faceShare: number;
  readonly laterFactor: number;
  /** For walls whose own ground level is not known. */
  readonly groundLevels?: readonly GroundLevelRow[];
};
