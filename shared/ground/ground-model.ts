import { certain } from '../numerics/range.ts';
import type { Drive } from './drive.ts';
import { blocksOfPieces, type Block } from './block.ts';
import type { LossGroup } from './loss-group.ts';
import { MethodError } from '../method-error.ts';
import type { Piece } from './piece.ts';
import { piecesOfDrive } from './pieces-of-drive.ts';
import type { TroughWidthRule } from './trough-width-rule.ts';
import type { Focus } from './vector-focus.ts';

/**
 * The rules by which the ground moves.
 *
 * Units: none. Valid: see TroughWidthRule and Focus. Source: [own].
 */
export type GroundRules = { readonly depth: TroughWidthRule; readonly focus: Focus };

/**
 * The drives of a scheme made ready for computing: pieces in blocks and the groups of volume loss.
 * Shafts and boxes will stand beside the drives as further sources of movement.
 *
 * Units: lengths m of each drive. Valid: made by `groundModel`. Source: [own].
 */
export type GroundModel = {
  readonly drives: readonly Drive[];
  readonly pieces: readonly (readonly Piece[])[];
  readonly lengths: readonly number[];
  readonly blocks: readonly Block[];
  readonly groups: readonly LossGroup[];
  readonly rules: GroundRules;
};

function piecesOrNamedError(drive: Drive, index: number, groups: LossGroup[]): Piece[] {
  try {
    return piecesOfDrive(drive, index, groups);
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    throw new MethodError(error.code, error.message, `drives[${index}].${error.field ?? 'axis'}`);
  }
}

/**
 * Makes drives ready for computing, once for any number of walls. Without drives nothing moves.
 *
 * Units: m. Valid: throws `zero-length` or `bad-intervals` with the field at fault, as
 * `drives[0].axis[3]`. Source: [own].
 */
export function groundModel(drives: readonly Drive[], rules: GroundRules): GroundModel {
  const groups: LossGroup[] = [];
  const pieces = drives.map((drive, index) => piecesOrNamedError(drive, index, groups));
  if (groups.length === 0) groups.push({ factors: certain(0) });
  const highFactors = groups.map((group) => group.factors.high);
  const lengths = pieces.map((ofDrive) => {
    const last = ofDrive.at(-1);
    return last === undefined ? 0 : last.from + last.length;
  });
  const blocks = pieces.flatMap((ofDrive) => blocksOfPieces(ofDrive, highFactors));
  return { drives, pieces, lengths, blocks, groups, rules };
}
