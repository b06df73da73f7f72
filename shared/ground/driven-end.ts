import { normalQuantile } from '../numerics/normal-quantile.ts';
import { levelAlong, type Piece } from './piece.ts';

/**
 * The piece of a drive that holds a chainage, the last one beyond its end.
 *
 * Units: m. Valid: undefined only for a drive without pieces. Source: [own].
 */
export function pieceAtChainage(pieces: readonly Piece[], chainage: number): Piece | undefined {
  return pieces.find((piece) => chainage < piece.from + piece.length) ?? pieces.at(-1);
}

/**
 * The chainage up to which a drive acts when its face stands at `face`: the face itself where half of
 * the final settlement has happened above it, else shifted by i·Φ⁻¹(share) along the drive, i at the
 * level considered and at the face. A share of 0.275 puts it 0.598 i behind the face.
 *
 * Units: chainages m. Valid: a face at or beyond the end means complete and unshifted; at or before
 * the start, not begun. Source: attewell-woodman-1982 (half above an open face), mair-taylor-1997
 * (25 to 30 % above closed faces); the shift is [own].
 */
export function drivenEnd(
  pieces: readonly Piece[],
  length: number,
  face: number | undefined,
  share: number,
  widthAt: (piece: Piece, axisLevel: number) => number,
): number {
  if (face === undefined || face >= length) return length;
  const piece = pieceAtChainage(pieces, face);
  if (face <= 0 || piece === undefined) return 0;
  if (share === 0.5) return face;
  const width = Math.max(0, widthAt(piece, levelAlong(piece, face - piece.from)));
  return Math.min(length, Math.max(0, face + width * normalQuantile(share)));
}
