import type { GroundModel } from '../ground/ground-model.ts';
import type { Piece } from '../ground/piece.ts';
import { usesTroughWidthParameter, type TroughWidthRule } from '../ground/trough-width-rule.ts';
import { certain, type Range } from '../numerics/range.ts';

/**
 * What of a sampled run is drawn together: all lengths of drive with the same ranges of volume loss and
 * of K. Under a rule by layers the layers are the ground: their K are drawn once for all drives, each at the
 * same position in its range as in the bracket, and `troughWidth` is the mean of their ranges, so that
 * the K of each layer is triangular as long as the ranges are alike in shape. `lossInput` and
 * `widthInput` say which of the drawn inputs is whose; grounds are numbered from 1.
 *
 * Units: volumeLoss m/m, troughWidth none. Valid: made by `sampledGrounds`; where K plays no part its
 * range has no width. Source: [own].
 */
export type SampledGround = {
  readonly number: number;
  readonly volumeLoss: Range;
  readonly troughWidth: Range;
  readonly lossInput: number;
  readonly widthInput: number;
};

function isSame(a: Range, b: Range): boolean {
  return a.low === b.low && a.central === b.central && a.high === b.high;
}

function meanOfLayers(layers: readonly { readonly troughWidth: Range }[]): Range {
  const mean = (end: keyof Range) =>
    layers.reduce((sum, { troughWidth }) => sum + troughWidth[end], 0) / layers.length;
  return { low: mean('low'), central: mean('central'), high: mean('high') };
}

/** The K that counts for a piece under a rule. */
function troughWidthOf(rule: TroughWidthRule, piece: Piece): Range {
  if (rule.kind === 'layered') return meanOfLayers(rule.layers);
  return usesTroughWidthParameter(rule) ? piece.troughWidth : certain(piece.troughWidth.central);
}

/**
 * Whether a piece is of a ground.
 *
 * Units: none. Valid: a ground and a piece of one model. Source: [own].
 */
export function isOfGround({ rules }: GroundModel, ground: SampledGround, piece: Piece): boolean {
  return (
    isSame(ground.volumeLoss, piece.volumeLoss) &&
    (rules.depth.kind === 'layered' ||
      isSame(ground.troughWidth, troughWidthOf(rules.depth, piece)))
  );
}

/**
 * The grounds of a model in the order of driving: they are the model's, so a seed draws the same inputs for
 * every building. Input 0 is E/G.
 *
 * Units: as SampledGround. Valid: any model. Source: [own].
 */
export function sampledGrounds(model: GroundModel): SampledGround[] {
  const grounds: SampledGround[] = [];
  const isLayered = model.rules.depth.kind === 'layered';
  for (const piece of model.pieces.flat()) {
    if (grounds.some((ground) => isOfGround(model, ground, piece))) continue;
    const lossInput = 1 + 2 * grounds.length;
    grounds.push({
      number: grounds.length + 1,
      volumeLoss: piece.volumeLoss,
      troughWidth: troughWidthOf(model.rules.depth, piece),
      lossInput,
      widthInput: isLayered ? 2 : lossInput + 1,
    });
  }
  return grounds;
}
