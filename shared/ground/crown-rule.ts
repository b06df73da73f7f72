import { MethodError } from '../method-error.ts';
import type { Warning } from '../warnings.ts';
import type { Segment } from '../geometry/point.ts';
import type { Levels } from './levels.ts';
import type { Piece } from './piece.ts';
import { distanceFromPlace, type Place } from './place.ts';

/**
 * How near, in trough widths at ground level, a drive is beside a wall.
 *
 * Units: i. Valid: a constant. Source: mair-taylor-burland-1996, for the reach of a trough.
 */
export const BESIDE_IN_WIDTHS = 2.5;

/**
 * Whether a piece of drive comes so high, or its trough width so low, that the crown rule must be asked.
 *
 * Units: m. Valid: `width` is i at the founding level. Source: [common] for one diameter.
 */
export function needsCrownRule(piece: Piece, levels: Levels, width: number): boolean {
  const crown = levels.axis + piece.diameter / 2;
  return Math.min(levels.founding, levels.ground) - crown < piece.diameter || !(width > 0);
}

/**
 * Whether a piece of drive can be computed at a place, and what to warn of. A trough forms above a
 * drive: a piece whose crown is at or above the founding level, or which has no trough width there,
 * is refused when it is beside the place, and left out with a warning when it is farther off.
 *
 * Units: m. Valid: `driven` is the plan of what is driven of the piece, `widthAtGround` is i at ground level; throws `below-crown-beside-drive` or
 * `trough-width-not-positive`, field `foundingLevel`. Source: [own]; the reach is
 * mair-taylor-burland-1996, the diameters of the warnings are [common].
 */
export function crownRule(
  piece: Piece,
  driven: Segment,
  driveName: string,
  place: Place,
  levels: Levels,
  width: number,
  widthAtGround: number,
): { leftOut: boolean; warnings: readonly Warning[] } {
  const { diameter } = piece;
  const crown = levels.axis + diameter / 2;
  const belowCrown = crown >= levels.founding;
  const impossible = belowCrown || !(width > 0);
  const distance = distanceFromPlace(place, driven);
  const beside = distance < BESIDE_IN_WIDTHS * Math.max(0, widthAtGround) + diameter / 2;
  if (impossible && !beside) {
    return { leftOut: true, warnings: ['drive above the founding level left out'] };
  }
  const where = `drive "${driveName}" at chainage ${piece.from.toFixed(0)} m, ${distance.toFixed(1)} m off in plan`;
  if (belowCrown) {
    throw new MethodError(
      'below-crown-beside-drive',
      `A founding level of ${levels.founding} m is not above the crown (${crown.toFixed(2)} m) of ${where}.`,
      'foundingLevel',
    );
  }
  if (impossible) {
    throw new MethodError(
      'trough-width-not-positive',
      `The trough width rule gives ${width.toFixed(2)} m at a founding level of ${levels.founding} m above ${where}. Choose the constant rule or another K.`,
      'foundingLevel',
    );
  }
  const warnings: Warning[] = [];
  if (beside && levels.founding - crown < diameter) {
    warnings.push('founded within one diameter of the crown');
  }
  if (beside && levels.ground - crown < diameter) warnings.push('cover under one diameter');
  return { leftOut: false, warnings };
}
