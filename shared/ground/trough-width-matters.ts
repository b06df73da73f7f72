import { isRange } from '../numerics/range.ts';
import type { GroundModel } from './ground-model.ts';
import { usesTroughWidthParameter } from './trough-width-rule.ts';

/**
 * Whether K has a range that changes anything, so that its five positions must be told apart.
 *
 * Units: none. Valid: any model. Source: [own].
 */
export function troughWidthMatters(model: GroundModel): boolean {
  const { depth } = model.rules;
  if (depth.kind === 'layered') return depth.layers.some((layer) => isRange(layer.troughWidth));
  return (
    usesTroughWidthParameter(depth) &&
    model.pieces.some((ofDrive) => ofDrive.some((piece) => isRange(piece.troughWidth)))
  );
}
