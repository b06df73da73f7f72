/**
 * The value some share of the way from one value to another, reckoned from the nearer of the two: so
 * both ends come out exactly, and the same from either side.
 *
 * Units: those of the values, share none. Valid: share 0 to 1. Source: [own], linear interpolation.
 */
export function interpolate(from: number, to: number, share: number): number {
  return share < 0.5 ? from + share * (to - from) : to - (1 - share) * (to - from);
}
