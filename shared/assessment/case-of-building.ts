import { joinedWalls, type RowsByBuilding } from '../building/joined-walls.ts';
import type { Wall } from '../building/wall.ts';
import { wallLength } from '../building/wall.ts';
import type { Drive } from '../ground/drive.ts';
import { isRange, type Range } from '../numerics/range.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import type { AssessCase } from '../schemas/assess-case.ts';
import type { RunInputs } from './outcome-of-building.ts';
import type { PreparedBuilding } from './prepared-building.ts';
import type { AssessmentRules } from './rules.ts';

type CaseRules = NonNullable<AssessCase['rules']>;
type Three = [number, number, number];

function three({ low, central, high }: Range): Three {
  return [low, central, high];
}

function caseRules(rules: AssessmentRules): CaseRules {
  const { depth, focus, cutOff, horizontalStrain, compression, leadingCategory } = rules;
  return {
    depth:
      depth.kind === 'layered'
        ? {
            layers: depth.layers.map(({ baseLevel, troughWidth }) => ({
              baseLevel,
              troughWidth: three(troughWidth),
            })),
          }
        : depth.kind,
    focus,
    cutoff: cutOff.kind === 'settlement' ? cutOff.settlement : { widths: cutOff.widths },
    horizontalStrain,
    compression,
    ...(leadingCategory > 0 && {
      leadingCategory: leadingCategory as Exclude<typeof leadingCategory, 0>,
    }),
  };
}

function caseDrive(drive: Drive): AssessCase['drives'][number] {
  const { name, axis, diameter, volumeLoss, troughWidth, faceShare, laterFactor } = drive;
  return {
    name,
    axis: axis.map(([easting, northing, level]): Three => [easting, northing, level]),
    diameter,
    volumeLoss: three(volumeLoss),
    troughWidth: three(troughWidth),
    faceShare,
    laterFactor,
    intervals: drive.intervals.map((interval) => ({
      from: interval.from,
      to: interval.to,
      ...(interval.diameter !== undefined && { diameter: interval.diameter }),
      ...(interval.volumeLoss !== undefined && { volumeLoss: three(interval.volumeLoss) }),
      ...(interval.troughWidth !== undefined && { troughWidth: three(interval.troughWidth) }),
    })),
  };
}

function caseWall(wall: Wall): AssessCase['walls'][number] {
  const { name, segment, foundingLevel, groundLevel, height, eOverG, poisson } = wall;
  return {
    name,
    from: [segment.start[0], segment.start[1]],
    to: [segment.end[0], segment.end[1]],
    foundingLevel,
    groundLevel,
    height,
    eOverG: isRange(eOverG) ? [eOverG.low, eOverG.high] : eOverG.central,
    poisson,
  };
}

/**
 * One building of a run as a case for assessment outside the workbench: the drives, the rules, its walls and
 * the rows that they stand in.
 *
 * Units: m, volume losses as fractions. Valid: a prepared building with at least one wall; the figures of the
 * case's worst wall are those of the run. Source: [own].
 */
export function caseOfBuilding(
  { model, rules }: RunInputs,
  { groundLevel }: Pick<AlignmentDesign, 'groundLevel'>,
  building: PreparedBuilding,
  rows: RowsByBuilding,
): AssessCase {
  const joined = joinedWalls(building.id, building.walls, rows).map(({ wall }) => wall);
  const walls = [...building.walls, ...joined].filter((wall) => wallLength(wall) > 0);
  return {
    groundLevel,
    rules: caseRules(rules),
    drives: model.drives.map(caseDrive),
    walls: walls.map(caseWall),
  };
}
