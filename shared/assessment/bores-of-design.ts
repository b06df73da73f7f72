import type { AlignmentDesign } from '../schemas/alignments.ts';

/**
 * A bore of a designed alignment: where it runs beside the drawn line, positive to the left of it, and
 * what its volume loss is multiplied by.
 *
 * Units: offset m, laterFactor none. Valid: made by `boresOfDesign`. Source: [own].
 */
export type Bore = {
  readonly name: string;
  readonly offset: number;
  readonly laterFactor: number;
};

/**
 * The bores of a designed alignment in the order of driving: one, or two on either side of the line.
 *
 * Units: as Bore. Valid: any design; left and right are those of the line as it was drawn, whichever way
 * it is driven. Source: [own].
 */
export function boresOfDesign({ bores }: Pick<AlignmentDesign, 'bores'>): Bore[] {
  if (bores.kind === 'single') return [{ name: 'Drive', offset: 0, laterFactor: 1 }];
  const factorOf = (side: 'left' | 'right') => (bores.later === side ? bores.laterFactor : 1);
  const half = bores.spacing / 2;
  const left = { name: 'Left drive', offset: half, laterFactor: factorOf('left') };
  const right = { name: 'Right drive', offset: -half, laterFactor: factorOf('right') };
  return bores.later === 'left' ? [right, left] : [left, right];
}
