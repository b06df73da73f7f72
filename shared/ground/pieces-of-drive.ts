import { MethodError } from '../method-error.ts';
import { planDistance } from '../geometry/plan-distance.ts';
import type { PlanPoint } from '../geometry/point.ts';
import type { Drive } from './drive.ts';
import { groupWithFactors, lossFactors, unitVolumeLoss, type LossGroup } from './loss-group.ts';
import type { Piece } from './piece.ts';
import { sectionsOfDrive, type Section } from './sections-of-drive.ts';
import { volumePerMetre } from './volume-loss.ts';

/** Level change along a piece, in diameters: so that the crown rule sees gradients locally. */
const LARGEST_LEVEL_CHANGE = 0.1;

type Leg = {
  start: PlanPoint;
  end: PlanPoint;
  levels: [number, number];
  from: number;
  length: number;
};

function legsOfAxis(drive: Drive): Leg[] {
  const legs: Leg[] = [];
  let from = 0;
  for (const [index, start] of drive.axis.entries()) {
    const end = drive.axis[index + 1];
    if (end === undefined) break;
    const plan: [PlanPoint, PlanPoint] = [
      [start[0], start[1]],
      [end[0], end[1]],
    ];
    const length = planDistance(...plan);
    if (length === 0) {
      const field = `axis[${index + 1}]`;
      throw new MethodError('zero-length', 'It lies on the point before it in plan.', field);
    }
    legs.push({ start: plan[0], end: plan[1], levels: [start[2], end[2]], from, length });
    from += length;
  }
  return legs;
}

type Owner = { drive: number; group: number; factor: number };

function cutLeg(leg: Leg, from: number, to: number, section: Section, owner: Owner): Piece {
  const [a, b] = [(from - leg.from) / leg.length, (to - leg.from) / leg.length];
  const [dx, dy] = [leg.end[0] - leg.start[0], leg.end[1] - leg.start[1]];
  const rise = leg.levels[1] - leg.levels[0];
  const { diameter, volumeLoss, troughWidth } = section;
  return {
    drive: owner.drive,
    group: owner.group,
    from,
    length: to - from,
    plan: {
      start: [leg.start[0] + a * dx, leg.start[1] + a * dy],
      end: [leg.start[0] + b * dx, leg.start[1] + b * dy],
    },
    cosEast: dx / leg.length,
    cosNorth: dy / leg.length,
    startLevel: leg.levels[0] + a * rise,
    endLevel: leg.levels[0] + b * rise,
    diameter,
    unitLoss: owner.factor * volumePerMetre(unitVolumeLoss(volumeLoss), diameter),
    volumeLoss,
    troughWidth,
  };
}

function cutOnGradient(leg: Leg, section: Section, owner: Owner): Piece[] {
  const from = Math.max(leg.from, section.from);
  const length = Math.min(leg.from + leg.length, section.to) - from;
  const change = (Math.abs(leg.levels[1] - leg.levels[0]) * length) / leg.length;
  const parts = Math.max(1, Math.ceil(change / (LARGEST_LEVEL_CHANGE * section.diameter)));
  return Array.from({ length: parts }, (_, part) =>
    cutLeg(
      leg,
      from + (part * length) / parts,
      from + ((part + 1) * length) / parts,
      section,
      owner,
    ),
  );
}

/**
 * A drive as straight pieces, cut at its vertices, where its inputs change and along gradients.
 * Gradients are cut further when the level of a wall is known.
 *
 * Units: m. Valid: at least two points, no two neighbours alike in plan, else throws `zero-length`
 * with the field at fault; groups are added as they are met. Source: [own].
 */
export function piecesOfDrive(drive: Drive, index: number, groups: LossGroup[]): Piece[] {
  const legs = legsOfAxis(drive);
  const last = legs.at(-1);
  if (last === undefined) {
    throw new MethodError('zero-length', 'A drive needs at least two points.', 'axis');
  }
  const pieces: Piece[] = [];
  const sections = sectionsOfDrive(drive, last.from + last.length);
  for (const leg of legs) {
    for (const section of sections) {
      if (section.from >= leg.from + leg.length || section.to <= leg.from) continue;
      const group = groupWithFactors(groups, lossFactors(section.volumeLoss));
      const owner = { drive: index, group, factor: drive.laterFactor };
      pieces.push(...cutOnGradient(leg, section, owner));
    }
  }
  return pieces;
}
