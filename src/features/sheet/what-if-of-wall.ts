import { pieceBesideWall } from '../../../shared/assessment/piece-beside-wall.ts';
import type { AssessmentRules } from '../../../shared/assessment/rules.ts';
import { wallLength, type Wall } from '../../../shared/building/wall.ts';
import type { GroundModel } from '../../../shared/ground/ground-model.ts';
import type { Piece } from '../../../shared/ground/piece.ts';
import { percentFromRatio } from '../../../shared/units/percent-from-ratio.ts';
import { whatIfPath } from '../method/what-if/what-if-address.ts';
import { leftOutOfWall } from './left-out-of-wall.ts';

const DEGREES = 180 / Math.PI;
/** Millimetres and thousandths of a degree: what a field can be read with. */
const PLACES = 3;
/** A fraction as per cent has no more digits than it had. */
const DIGITS = 12;

function figure(value: number): string {
  return String(Number(value.toFixed(PLACES)) + 0);
}

function percent(ratio: number): string {
  return String(Number(percentFromRatio(ratio).toPrecision(DIGITS)));
}

/** Where a wall stands as seen along a drive: how far it begins to the left of it, and how it is turned. */
function seenAlong({ plan, cosEast, cosNorth }: Piece, { segment }: Wall) {
  const { start, end } = segment;
  const distance = cosEast * (start[1] - plan.start[1]) - cosNorth * (start[0] - plan.start[0]);
  const [east, north] = [end[0] - start[0], end[1] - start[1]];
  const along = Math.abs(cosEast * east + cosNorth * north);
  const left = cosEast * north - cosNorth * east;
  const away = distance < 0 ? -left : left;
  return { distance, angle: DEGREES * Math.atan2(away, along) };
}

/** The address of a what-if on a wall of a sheet; undefined where there is no drive. */
export function whatIfOfWall(
  model: GroundModel,
  wall: Wall,
  rules: AssessmentRules,
): string | undefined {
  const beside = pieceBesideWall(model, wall);
  if (beside === undefined) return undefined;
  const { piece, axis } = beside;
  const { volumeLoss, troughWidth, diameter } = piece;
  const { groundLevel, foundingLevel, height, eOverG, poisson } = wall;
  const { distance, angle } = seenAlong(piece, wall);
  const draft = {
    lossLow: percent(volumeLoss.low),
    lossCentral: percent(volumeLoss.central),
    lossHigh: percent(volumeLoss.high),
    widthLow: String(troughWidth.low),
    widthCentral: String(troughWidth.central),
    widthHigh: String(troughWidth.high),
    diameter: String(diameter),
    axisDepth: figure(groundLevel - axis),
    distance: figure(distance),
    length: figure(wallLength(wall)),
    angle: figure(angle),
    height: figure(height),
    founding: figure(groundLevel - foundingLevel),
    eOverG: String(eOverG.central),
    poisson: String(poisson),
  };
  return whatIfPath(draft, leftOutOfWall(model, wall, rules, beside));
}
