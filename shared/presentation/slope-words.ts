/**
 * A slope as it is said, `1 in 780`, whichever way it falls; level ground has none.
 *
 * Units: slope m/m. Valid: finite. Source: [own].
 */
export function slopeWords(slope: number): string {
  return slope === 0 ? 'none' : `1 in ${Math.round(1 / Math.abs(slope))}`;
}
