import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import type { Piece } from './piece.ts';

/**
 * Pieces that follow each other, with what bounds their effect at a distance: the box round them,
 * their highest and lowest axis level, largest diameter, range of K and the trough volume of all at
 * the high volume loss.
 *
 * Units: m, volume m³. Valid: at least one piece. Source: [own].
 */
export type Block = {
  readonly pieces: readonly Piece[];
  readonly box: Box;
  readonly highestAxis: number;
  readonly lowestAxis: number;
  readonly largestDiameter: number;
  readonly smallestK: number;
  readonly largestK: number;
  readonly volume: number;
};

/** Small enough that little more than the reach of a wall is summed, large enough to be worth a test. */
const PIECES_PER_BLOCK = 6;

function blockOf(pieces: readonly Piece[], highFactors: readonly number[]): Block {
  const levels = pieces.flatMap((piece) => [piece.startLevel, piece.endLevel]);
  return {
    pieces,
    box: boundingBox(pieces.flatMap((piece) => [piece.plan.start, piece.plan.end])),
    highestAxis: Math.max(...levels),
    lowestAxis: Math.min(...levels),
    largestDiameter: Math.max(...pieces.map((piece) => piece.diameter)),
    smallestK: Math.min(...pieces.map((piece) => piece.troughWidth.low)),
    largestK: Math.max(...pieces.map((piece) => piece.troughWidth.high)),
    volume: pieces.reduce(
      (sum, piece) => sum + piece.unitLoss * piece.length * (highFactors[piece.group] ?? 0),
      0,
    ),
  };
}

/**
 * The pieces of one drive in blocks, for culling.
 *
 * Units: m. Valid: pieces in the order of driving; highFactors are the high factors of the groups.
 * Source: [own].
 */
export function blocksOfPieces(pieces: readonly Piece[], highFactors: readonly number[]): Block[] {
  const blocks: Block[] = [];
  for (let first = 0; first < pieces.length; first += PIECES_PER_BLOCK) {
    blocks.push(blockOf(pieces.slice(first, first + PIECES_PER_BLOCK), highFactors));
  }
  return blocks;
}
