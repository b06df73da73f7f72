const ROUND = [5, 2, 1];

/** The largest of 1, 2, 5, 10, 20, 50 … that is no larger than `most`. */
export function roundStep(most: number): number {
  const power = 10 ** Math.floor(Math.log10(most));
  const factor = ROUND.find((one) => one * power <= most) ?? 1;
  return factor * power;
}
