import type { JoinedWall } from '../building/joined-walls.ts';
import { wallLength, type Wall } from '../building/wall.ts';
import type { Category } from '../damage/categories.ts';
import { rankinClass, type RankinClass } from '../damage/rankin.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import { CENTRAL } from '../numerics/range.ts';
import type { Warning } from '../warnings.ts';
import { resultOfWall, type WallResult } from './assess-wall.ts';
import { basisOf, type Basis } from './basis.ts';
import { bracketOfWall, fieldsOverTroughWidth, worstBracket, type Bracket } from './bracket.ts';
import { breakpointOfWall, type Breakpoint } from './breakpoint-of-wall.ts';
import { loadedProfile } from './loaded-profile.ts';
import type { Moment } from './moment.ts';
import type { AssessmentRules } from './rules.ts';
import { sensitivityOf, type Sensitivity } from './sensitivity.ts';

/**
 * One wall at one moment, alone or as part of its row.
 *
 * Units: as WallResult. Valid: made by `assessBuilding`. Source: as WallResult.
 */
export type WallAtMoment = {
  readonly wall: Wall;
  readonly wallIndex: number;
  readonly joined: boolean;
  readonly moment: string;
  readonly result: WallResult;
  readonly bracket: Bracket;
  readonly breakpoint: Breakpoint | undefined;
};

/**
 * The strain stage of a building: the worst of its walls, alone and in their rows, at the worst moment,
 * with the range of answers and what it rests on. `governing` is an index of `walls`.
 *
 * Units: m and m/m. Valid: never NaN. Source: mair-taylor-burland-1996, burland-1995.
 */
export type BuildingResult = {
  readonly walls: readonly WallAtMoment[];
  readonly governing: number;
  readonly strain: number;
  readonly category: Category;
  readonly settlementMax: number;
  readonly slopeMax: number;
  readonly rankin: RankinClass;
  readonly bracket: Bracket | undefined;
  readonly breakpoint: Breakpoint | undefined;
  readonly sensitivity: Sensitivity | undefined;
  readonly warnings: readonly Warning[];
  readonly basis: Basis;
};

function assessAtMoment(
  model: GroundModel,
  { wall, wallIndex, joined }: Pick<WallAtMoment, 'wall' | 'wallIndex' | 'joined'>,
  rules: AssessmentRules,
  { name, faces }: Moment,
): WallAtMoment[] {
  const fields = fieldsOverTroughWidth(model, wall, rules, faces);
  const central = fields[CENTRAL];
  if (central === undefined) return [];
  const loaded = loadedProfile(central, lossFactorsAt(model, 'central'));
  return [
    {
      wall,
      wallIndex,
      joined,
      moment: name,
      result: resultOfWall(central, loaded, wall, rules),
      bracket: bracketOfWall(model, fields, wall, rules),
      breakpoint: breakpointOfWall(model, fields, wall, rules, faces),
    },
  ];
}

function smallestBreakpoint(walls: readonly WallAtMoment[]): Breakpoint | undefined {
  return walls
    .flatMap(({ breakpoint }) => (breakpoint === undefined ? [] : [breakpoint]))
    .sort((a, b) => a.factor - b.factor)[0];
}

function indexOfWorst(walls: readonly WallAtMoment[]): number {
  let worst = -1;
  for (const [index, { result }] of walls.entries()) {
    if (result.strain > (walls[worst]?.result.strain ?? -1)) worst = index;
  }
  return worst;
}

/**
 * Assesses the walls of a building, alone and in their rows, at every moment given. Walls of no length
 * are passed over; a building without walls is not affected.
 *
 * Units: m and m/m. Valid: throws as `levelField`. Source: as BuildingResult.
 */
export function assessBuilding(
  model: GroundModel,
  walls: readonly Wall[],
  joined: readonly JoinedWall[],
  rules: AssessmentRules,
  moments: readonly Moment[],
): BuildingResult {
  const all = [
    ...walls.map((wall, wallIndex) => ({ wall, wallIndex, joined: false })),
    ...joined.map(({ wall, wallIndex }) => ({ wall, wallIndex, joined: true })),
  ].filter(({ wall }) => wallLength(wall) > 0);
  const assessed = moments.flatMap((moment) =>
    all.flatMap((wall) => assessAtMoment(model, wall, rules, moment)),
  );
  const governing = indexOfWorst(assessed);
  const worst = assessed[governing]?.result;
  const largest = (quantity: 'settlementMax' | 'slopeMax') =>
    Math.max(0, ...assessed.map(({ result }) => result[quantity]));
  const [settlementMax, slopeMax] = [largest('settlementMax'), largest('slopeMax')];
  const brackets = assessed.map(({ bracket }) => bracket);
  const bracket = brackets.length === 0 ? undefined : worstBracket(brackets);
  return {
    walls: assessed,
    governing,
    strain: worst?.strain ?? 0,
    category: worst?.category ?? 0,
    settlementMax,
    slopeMax,
    rankin: rankinClass(slopeMax, settlementMax),
    bracket,
    breakpoint: smallestBreakpoint(assessed),
    sensitivity: bracket === undefined ? undefined : sensitivityOf(bracket),
    warnings: [...new Set(assessed.flatMap(({ result }) => result.warnings))],
    basis: basisOf(model, rules),
  };
}
