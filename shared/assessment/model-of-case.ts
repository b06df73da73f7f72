import type { Drive, DriveInterval } from '../ground/drive.ts';
import { groundModel, type GroundModel } from '../ground/ground-model.ts';
import { certain, isRange, rangeOf } from '../numerics/range.ts';
import type { Wall } from '../building/wall.ts';
import type { AssessCase } from '../schemas/assess-case.ts';
import { DEFAULT_RULES, type AssessmentRules } from './rules.ts';

type CaseDrive = AssessCase['drives'][number];
type CaseWall = AssessCase['walls'][number];
type CaseInterval = NonNullable<CaseDrive['intervals']>[number];

/**
 * A checked case made ready: the ground, the rules and each drive's face.
 *
 * Units: as the parts. Valid: made by `modelOfCase`. Source: [own].
 */
export type CaseModel = {
  readonly model: GroundModel;
  readonly rules: AssessmentRules;
  readonly faces: readonly (number | undefined)[];
  readonly groundLevel: number;
  readonly hasRanges: boolean;
};

function intervalOfCase(interval: CaseInterval): DriveInterval {
  const { from, to, diameter, volumeLoss, troughWidth } = interval;
  return {
    from,
    to,
    ...(diameter === undefined ? {} : { diameter }),
    ...(volumeLoss === undefined ? {} : { volumeLoss: rangeOf(volumeLoss) }),
    ...(troughWidth === undefined ? {} : { troughWidth: rangeOf(troughWidth) }),
  };
}

function driveOfCase(drive: CaseDrive): Drive {
  return {
    name: drive.name,
    axis: drive.axis,
    diameter: drive.diameter,
    volumeLoss: rangeOf(drive.volumeLoss),
    troughWidth: rangeOf(drive.troughWidth),
    intervals: (drive.intervals ?? []).map(intervalOfCase),
    faceShare: drive.faceShare ?? 0.5,
    laterFactor: drive.laterFactor ?? 1,
  };
}

function rulesOfCase(rules: AssessCase['rules']): AssessmentRules {
  const cutoff = rules?.cutoff;
  return {
    ...DEFAULT_RULES,
    ...(rules?.depth === undefined ? {} : { depth: { kind: rules.depth } }),
    ...(rules?.focus === undefined ? {} : { focus: rules.focus }),
    ...(rules?.horizontalStrain === undefined ? {} : { horizontalStrain: rules.horizontalStrain }),
    ...(rules?.compression === undefined ? {} : { compression: rules.compression }),
    ...(cutoff === '2.5i' ? { cutOff: { kind: 'widths', widths: 2.5 } as const } : {}),
    ...(typeof cutoff === 'number'
      ? { cutOff: { kind: 'settlement', settlement: cutoff } as const }
      : {}),
  };
}

/**
 * A wall of a case; where its ground level is not given it is the case's.
 *
 * Units: m. Valid: a checked wall; two values of E/G are low and high, the central one half-way.
 * Source: [own].
 */
export function wallOfCase(wall: CaseWall, groundLevel: number): Wall {
  const { name, from, to, foundingLevel, height, eOverG, poisson } = wall;
  return {
    name,
    segment: { start: from, end: to },
    groundLevel: wall.groundLevel ?? groundLevel,
    foundingLevel,
    height,
    eOverG:
      typeof eOverG === 'number'
        ? certain(eOverG)
        : { low: eOverG[0], central: (eOverG[0] + eOverG[1]) / 2, high: eOverG[1] },
    poisson,
  };
}

/**
 * Makes a checked case ready for its walls.
 *
 * Units: as the parts. Valid: throws as `groundModel`. Source: [own].
 */
export function modelOfCase(input: Omit<AssessCase, 'walls'>): CaseModel {
  const rules = rulesOfCase(input.rules);
  const model = groundModel(input.drives.map(driveOfCase), rules);
  const hasRanges = model.pieces.some((ofDrive) =>
    ofDrive.some((piece) => isRange(piece.volumeLoss) || isRange(piece.troughWidth)),
  );
  return {
    model,
    rules,
    faces: input.drives.map((drive) => drive.faceChainage),
    groundLevel: input.groundLevel,
    hasRanges,
  };
}
