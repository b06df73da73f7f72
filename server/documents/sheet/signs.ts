import type { Piece } from '../pdf/words.ts';

/** The sign of a strain with what stands under it, and words after it. */
export function strainSign(under: string, after = ''): readonly Piece[] {
  return [{ text: 'ε' }, { text: under, rise: 'under' }, { text: after === '' ? '' : ` ${after}` }];
}
