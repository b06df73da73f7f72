import type { Drive, DriveInterval } from '../ground/drive.ts';
import { groundModel, type GroundModel } from '../ground/ground-model.ts';
import { certain, isRange, rangeOf } from '../numerics/range.ts';
import type { Wall } from '../building/wall.ts';
import type { AssessCase } from '../schemas/assess-case.ts';
import { DEFAULT_RULES, type AssessmentRules, type CutOffRule } from './rules.ts';

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

type CaseRules = NonNullable<AssessCase['rules']>;

function depthOfCase(depth: NonNullable<CaseRules['depth']>): AssessmentRules['depth'] {
  if (typeof depth === 'string') return { kind: depth };
  const layers = depth.layers.map(({ baseLevel, troughWidth }) => ({
    baseLevel,
    troughWidth: rangeOf(troughWidth),
  }));
  return { kind: 'layered', layers };
}

function cutOffOfCase(cutoff: NonNullable<CaseRules['cutoff']>): CutOffRule {
  if (typeof cutoff === 'number') return { kind: 'settlement', settlement: cutoff };
  return { kind: 'widths', widths: cutoff === '2.5i' ? 2.5 : cutoff.widths };
}

function rulesOfCase(rules: CaseRules = {}): AssessmentRules {
  const { depth, focus, cutoff, horizontalStrain, compression, leadingCategory } = rules;
  return {
    ...DEFAULT_RULES,
    ...(depth !== undefined && { depth: depthOfCase(depth) }),
    ...(focus !== undefined && { focus }),
    ...(cutoff !== undefined && { cutOff: cutOffOfCase(cutoff) }),
    ...(horizontalStrain !== undefined && { horizontalStrain }),
    ...(compression !== undefined && { compression }),
    ...(leadingCategory !== undefined && { leadingCategory }),
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
