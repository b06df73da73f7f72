import { DEFAULT_RULES, type AssessmentRules } from '../../../shared/assessment/rules.ts';
import { wallLength, type Wall } from '../../../shared/building/wall.ts';
import { nearestOnSegment } from '../../../shared/geometry/nearest-on-segment.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import type { PlanPoint } from '../../../shared/geometry/point.ts';
import type { GroundModel } from '../../../shared/ground/ground-model.ts';
import type { Piece } from '../../../shared/ground/piece.ts';
import { leftOutOf, type LeftOut } from '../method/what-if/left-out.ts';

type Beside = { readonly piece: Piece; readonly axis: number };

/** So many depths away a drive moves a wall no more. */
const NEAR = 5;
/** What is turned or climbs less than this over its length is straight and level. */
const STRAIGHT = 1e-6;

function climbs({ startLevel, endLevel, length }: Piece): boolean {
  return Math.abs(endLevel - startLevel) > STRAIGHT * length;
}

function bendsFrom(one: Piece, other: Piece): boolean {
  return Math.abs(one.cosEast * other.cosNorth - one.cosNorth * other.cosEast) > STRAIGHT;
}

function inputsOf({ diameter, volumeLoss, troughWidth }: Piece): string {
  return JSON.stringify([diameter, volumeLoss, troughWidth]);
}

function textOf({
  depth,
  focus,
  cutOff,
  horizontalStrain,
  compression,
  leadingCategory,
}: AssessmentRules): string {
  return JSON.stringify([depth, focus, cutOff, horizontalStrain, compression, leadingCategory]);
}

/** What one straight level drive by the usual rules leaves out of what moves a wall. */
export function leftOutOfWall(
  { drives, pieces }: Pick<GroundModel, 'drives' | 'pieces'>,
  wall: Wall,
  rules: AssessmentRules,
  { piece, axis }: Beside,
): readonly LeftOut[] {
  const { start, end } = wall.segment;
  const middle: PlanPoint = [(start[0] + end[0]) / 2, (start[1] + end[1]) / 2];
  const reach = wallLength(wall) / 2 + NEAR * (wall.groundLevel - axis);
  const ofDrive = pieces[piece.drive] ?? [];
  const near = ofDrive.filter(({ plan }) => nearestOnSegment(middle, plan).distance < reach);
  const ends = [ofDrive[0]?.plan.start, ofDrive.at(-1)?.plan.end];
  const applies: Readonly<Record<LeftOut, boolean>> = {
    drives: drives.length > 1,
    bends: near.some((one) => bendsFrom(one, piece)),
    climbs: near.some((one) => climbs(one)),
    inputs: near.some((one) => inputsOf(one) !== inputsOf(piece)),
    ends: ends.some((point) => point !== undefined && planDistance(middle, point) < reach),
    rules: textOf(rules) !== textOf(DEFAULT_RULES),
  };
  return leftOutOf(Object.entries(applies).flatMap(([name, does]) => (does ? [name] : [])));
}
