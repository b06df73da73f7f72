import { atPosition } from '../numerics/range.ts';
import { MethodError } from '../method-error.ts';
import type { Warning } from '../warnings.ts';
import type { Block } from './block.ts';
import { crownRule, needsCrownRule } from './crown-rule.ts';
import { drivenEnd } from './driven-end.ts';
import type { GroundModel } from './ground-model.ts';
import { PACK_STRIDE } from './kernel.ts';
import type { Levels } from './levels.ts';
import { drivenPlan, levelAlong, type Piece } from './piece.ts';
import type { Place } from './place.ts';
import type { Site } from './site.ts';
import { troughWidth } from './trough-width.ts';
import { ruleAt, type TroughWidthRule } from './trough-width-rule.ts';
import { troughWidthWarning } from './trough-width-warning.ts';
import { depthToFocus, focusWarning } from './vector-focus.ts';

/**
 * Which state of the ground: the position of K in its range, the face of each drive (undefined:
 * complete), and, where the movement of some pieces alone is wanted, which.
 *
 * Units: face chainages m. Valid: position 0 to 4; faces in the order of the drives; a missing one is
 * complete.
 * Source: [own].
 */
export type GroundState = {
  readonly position: number;
  readonly faces: readonly (number | undefined)[];
  readonly only?: (piece: Piece) => boolean;
};

/**
 * The drives as they act at one place: one pack of pieces for the kernel per group of volume loss.
 *
 * Units: smallestWidth m, Infinity where nothing reaches the place. Valid: for points of that place
 * only. Source: [own].
 */
export type LevelField = {
  readonly packs: readonly { readonly pack: Float64Array; readonly count: number }[];
  readonly smallestWidth: number;
  readonly warnings: readonly Warning[];
};

/**
 * A piece on a gradient is cut until a part is no longer than half of i, over which the middle stands for
 * all of it, or until i changes along it by no more than the method's 0.1 %.
 */
const PARTS_PER_WIDTH = 2;
const LARGEST_WIDTH_CHANGE = 0.001;
/** Where the width all but vanishes the rule for it is no longer worth following. */
const MOST_PARTS = 256;

type Packing = {
  readonly model: GroundModel;
  readonly rule: TroughWidthRule<number>;
  readonly place: Place;
  readonly state: GroundState;
  readonly packs: Pack[];
  readonly warnings: Set<Warning>;
  smallestWidth: number;
};

type Pack = { pack: Float64Array; count: number };

/** The array of a pack, made larger when gradients have filled it. */
function roomFor(target: Pack): Float64Array {
  if ((target.count + 1) * PACK_STRIDE > target.pack.length) {
    const larger = new Float64Array(2 * target.pack.length + PACK_STRIDE);
    larger.set(target.pack);
    target.pack = larger;
  }
  return target.pack;
}

function levelsAt(place: Place, axis: number): Levels {
  return { ground: place.groundLevel, founding: place.foundingLevel, axis };
}

function packPart(packing: Packing, piece: Piece, k: number, start: number, length: number): void {
  const { rule, place, model } = packing;
  const levels = levelsAt(place, levelAlong(piece, start + length / 2));
  const width = troughWidth(rule, k, levels);
  packing.smallestWidth = Math.min(packing.smallestWidth, width);
  const target = packing.packs[piece.group];
  if (target === undefined) return;
  const into = roomFor(target);
  const o = target.count * PACK_STRIDE;
  into[o] = piece.plan.start[0] + start * piece.cosEast;
  into[o + 1] = piece.plan.start[1] + start * piece.cosNorth;
  into[o + 2] = piece.cosEast;
  into[o + 3] = piece.cosNorth;
  into[o + 4] = 1 / width;
  into[o + 5] = length / width;
  into[o + 6] = piece.unitLoss / width;
  into[o + 7] = (width * width) / depthToFocus(model.rules.focus, levels);
  target.count += 1;
}

function packPiece(packing: Packing, piece: Piece, length: number): void {
  const { rule, place, model, warnings } = packing;
  const k = atPosition(piece.troughWidth, packing.state.position);
  const highest = Math.max(piece.startLevel, levelAlong(piece, length));
  const levels = levelsAt(place, highest);
  const width = troughWidth(rule, k, levels);
  if (needsCrownRule(piece, levels, width)) {
    const atGround = troughWidth(rule, k, { ...levels, founding: place.groundLevel });
    const name = model.drives[piece.drive]?.name ?? '';
    const crown = crownRule(piece, drivenPlan(piece, length), name, place, levels, width, atGround);
    for (const warning of crown.warnings) warnings.add(warning);
    if (crown.leftOut) return;
  }
  const ofWidth = troughWidthWarning(rule, k, levels);
  if (ofWidth !== undefined) warnings.add(ofWidth);
  const ofFocus = focusWarning(model.rules.focus, rule, k);
  if (ofFocus !== undefined) warnings.add(ofFocus);
  if (piece.startLevel === piece.endLevel) {
    packPart(packing, piece, k, 0, length);
    return;
  }
  const lowest = levelsAt(place, Math.min(piece.startLevel, levelAlong(piece, length)));
  const change = Math.abs(troughWidth(rule, k, lowest) - width);
  const byChange = change / (LARGEST_WIDTH_CHANGE * width);
  const byLength = (PARTS_PER_WIDTH * length) / width;
  const parts = Math.min(MOST_PARTS, Math.max(1, Math.ceil(Math.min(byChange, byLength))));
  for (let part = 0; part < parts; part++) {
    packPart(packing, piece, k, (part * length) / parts, length / parts);
  }
}

function packBlock(packing: Packing, block: Block, ends: readonly number[]): void {
  const { only } = packing.state;
  for (const piece of block.pieces) {
    if (only?.(piece) === false) continue;
    const end = ends[piece.drive] ?? 0;
    if (end > piece.from) packPiece(packing, piece, Math.min(piece.length, end - piece.from));
  }
}

function drivenEnds({ model, state, place, rule }: Packing): number[] {
  return model.drives.map((drive, index) => {
    const length = model.lengths[index] ?? 0;
    return drivenEnd(
      model.pieces[index] ?? [],
      length,
      state.faces[index],
      drive.faceShare,
      (piece, axis) =>
        troughWidth(rule, atPosition(piece.troughWidth, state.position), levelsAt(place, axis)),
    );
  });
}

/**
 * Packs the pieces that act at a place, for unit volume losses: driven up to the face, cut
 * finely enough on gradients, refused or left out by the crown rule.
 *
 * Units: m. Valid: throws `founding-above-ground`, `below-crown-beside-drive` and
 * `trough-width-not-positive` with field `foundingLevel`. Source: [own]; the parts cite theirs.
 */
export function levelField(
  model: GroundModel,
  { place, blocks }: Site,
  state: GroundState,
): LevelField {
  if (place.foundingLevel > place.groundLevel) {
    throw new MethodError(
      'founding-above-ground',
      `A founding level of ${place.foundingLevel} m is above the ground level of ${place.groundLevel} m.`,
      'foundingLevel',
    );
  }
  const room = blocks.reduce((sum, block) => sum + block.pieces.length, 0) * PACK_STRIDE;
  const packing: Packing = {
    model,
    rule: ruleAt(model.rules.depth, state.position),
    place,
    state,
    packs: model.groups.map(() => ({ pack: new Float64Array(room), count: 0 })),
    warnings: new Set(),
    smallestWidth: Infinity,
  };
  const ends = drivenEnds(packing);
  for (const block of blocks) packBlock(packing, block, ends);
  for (const drive of model.drives) {
    if (drive.laterFactor !== 1) packing.warnings.add('later drive increased');
  }
  return {
    packs: packing.packs,
    smallestWidth: packing.smallestWidth,
    warnings: [...packing.warnings],
  };
}
