/** The deep beam of the method, written out anew. */
export type OracleBeam = {
  readonly height: number;
  readonly eOverG: number;
  readonly poisson: number;
};

/** Bending and diagonal strain of a zone of a length, bent to Δ/L and stretched by ε_h. */
export function oracleBeamStrains(
  hogging: boolean,
  length: number,
  { height: H, eOverG, poisson: nu }: OracleBeam,
  ratio: number,
  stretch: number,
): { bending: number; diagonal: number } {
  // hogging: I = H³/3, t = H; sagging: I = H³/12, t = H/2; put into both formulae and shortened
  const perBending = hogging
    ? length / (12 * H) + (H / (2 * length)) * eOverG
    : length / (6 * H) + (H / (4 * length)) * eOverG;
  const slender = (length / H) ** 2 / eOverG;
  const perDiagonal = 1 + (hogging ? slender / 6 : (2 * slender) / 3);
  return {
    bending: ratio / perBending + stretch,
    diagonal: (stretch * (1 - nu)) / 2 + Math.hypot((stretch * (1 + nu)) / 2, ratio / perDiagonal),
  };
}
