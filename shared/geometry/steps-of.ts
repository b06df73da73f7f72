/** A length over a whole number of steps by less than this share of a step is rounding. */
const ROUNDING = 1e-9;

/**
 * Into how many equal steps a length is cut so that none is longer than wanted, at least one.
 *
 * Units: both lengths in one unit. Valid: length ≥ 0, longest > 0; steps may be longer than wanted
 * by 1e-9 of a step in all, so that rounding of a length does not add one. Source: [own].
 */
export function stepsOf(length: number, longest: number): number {
  return Math.max(1, Math.ceil(length / longest - ROUNDING));
}
