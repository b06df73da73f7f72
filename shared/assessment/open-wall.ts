import type { Wall } from '../building/wall.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import type { WallResult } from './assess-wall.ts';
import { bracketOfWall, fieldsOverTroughWidth, type Bracket } from './bracket.ts';
import { bracketPoints, type BracketPoint } from './bracket-points.ts';
import { breakpointOfWall, type Breakpoint } from './breakpoint-of-wall.ts';
import type { AssessmentRules } from './rules.ts';
import { sectionOfWall, type WallSection } from './section-of-wall.ts';
import { sensitivityOf, type Sensitivity } from './sensitivity.ts';
import { workingOfWall, type WorkingSection } from './working-of-wall.ts';

/**
 * All that there is to see of one wall in one state of the ground: result and working at the central
 * values, its section, bracket and breakpoint. The breakpoint is undefined where none is reached.
 *
 * Units: as the parts. Valid: made by `openWall`. Source: the parts cite theirs.
 */
export type OpenedWall = {
  readonly wall: Wall;
  readonly rules: AssessmentRules;
  readonly result: WallResult;
  readonly working: readonly WorkingSection[];
  readonly section: WallSection;
  readonly bracket: Bracket;
  readonly points: readonly BracketPoint[];
  readonly sensitivity: Sensitivity;
  readonly breakpoint: Breakpoint | undefined;
};

/**
 * Opens one wall up, for a reader who wants to see everything that its category rests on.
 *
 * Units: faces are chainages m. Valid: throws as `levelField`. Source: the parts cite theirs.
 */
export function openWall(
  model: GroundModel,
  wall: Wall,
  rules: AssessmentRules,
  faces: readonly (number | undefined)[],
): OpenedWall {
  const { result, sections } = workingOfWall(model, wall, rules, faces);
  const fields = fieldsOverTroughWidth(model, wall, rules, faces);
  const bracket = bracketOfWall(model, fields, wall, rules);
  const warnings = [...result.warnings, ...fields.flatMap(({ field }) => field.warnings)];
  const places = result.zones.flatMap(({ start, deflectionAt, end }) => [start, deflectionAt, end]);
  return {
    wall,
    rules,
    result: { ...result, warnings: [...new Set(warnings)] },
    working: sections,
    section: sectionOfWall(model, fields, places),
    bracket,
    points: bracketPoints(model, fields, wall, rules),
    sensitivity: sensitivityOf(bracket),
    breakpoint: breakpointOfWall(model, fields, wall, rules, faces),
  };
}
