/** What is flatter, a millimetre in a kilometre, is level to whoever stands on it. */
const LEVEL = 1e-6;

/**
 * A slope as it is said, `1 in 780`, whichever way it falls; level ground has none.
 *
 * Units: slope m/m. Valid: finite; what is flatter than 1 in a million counts as level. Source: [own].
 */
export function slopeWords(slope: number): string {
  const steep = Math.abs(slope);
  return steep < LEVEL ? 'none' : `1 in ${Math.round(1 / steep)}`;
}
