import { joinedWalls, type RowsByBuilding } from '../building/joined-walls.ts';
import type { Category } from '../damage/categories.ts';
import { categoryOfStrain } from '../damage/category-of-strain.ts';
import type { RankinClass } from '../damage/rankin.ts';
import { chainages } from '../geometry/chainages.ts';
import type { PlanPoint } from '../geometry/point.ts';
import { projectOntoPolyline } from '../geometry/project-onto-polyline.ts';
import type { GroundModel } from '../ground/ground-model.ts';
import { MethodError } from '../method-error.ts';
import type { Warning } from '../warnings.ts';
import { assessBuilding, type BuildingResult } from './assess-building.ts';
import type { Breakpoint } from './breakpoint-of-wall.ts';
import { holdsAt, withSensitivity, type Hold } from './holds.ts';
import { ALL_COMPLETE, type Moment } from './moment.ts';
import type { Assumed, PreparedBuilding } from './prepared-building.ts';
import type { AssessmentRules } from './rules.ts';
import { screenFootprint, type ScreeningLimits } from './screening.ts';
import type { BracketInput } from './sensitivity.ts';

/**
 * What all buildings of a run share: the ground, the rules, the limits of screening and the holds.
 *
 * Units: as the parts. Valid: moments at least one. Source: mair-taylor-burland-1996.
 */
export type RunInputs = {
  readonly model: GroundModel;
  readonly rules: AssessmentRules;
  readonly limits: ScreeningLimits;
  readonly holds: readonly Hold[];
  readonly moments?: readonly Moment[];
  /** The drawn line, which chainage and offset are told by; null where there is none. */
  readonly line: readonly PlanPoint[] | null;
};

/**
 * The strain stage of a building in figures: central, and the least and most over the bracket.
 *
 * Units: strains, slopes and deflection ratios m/m, settlement m. Valid: never NaN. Source: burland-1995.
 */
export type StrainOutcome = {
  readonly strain: { readonly low: number; readonly central: number; readonly high: number };
  readonly category: {
    readonly low: Category;
    readonly central: Category;
    readonly high: Category;
  };
  readonly settlement: number;
  readonly slope: number;
  readonly rankin: RankinClass;
  readonly breakpoint: Breakpoint | null;
  readonly isSettled: boolean;
  readonly sensitiveTo: BracketInput | null;
  /** The governing wall and how it bends; null where nothing is affected. */
  readonly governing: {
    readonly wall: string;
    readonly isRow: boolean;
    readonly mode: 'sagging' | 'hogging';
    readonly deflectionRatio: number;
    readonly horizontalStrain: number;
  } | null;
};

/**
 * What a run finds of one building. `stage` is where it stands by the figures: let go at 1 or 2, or to be
 * looked at in detail at 3; nothing is decided by it.
 *
 * Units: settlement m and slope m/m, the largest over the whole bracket at founding level; place m. Valid:
 * strain is null where screening lets the building go; fault says why nothing could be worked out; place is
 * that of the footprint's middle beside the drawn line, offset positive to the left of growing chainage.
 * Source: mair-taylor-burland-1996.
 */
export type BuildingOutcome = {
  readonly stage: 1 | 2 | 3;
  readonly heldBy: readonly string[];
  readonly settlement: number;
  readonly slope: number;
  readonly strain: StrainOutcome | null;
  readonly assumed: readonly Assumed[];
  readonly warnings: readonly Warning[];
  readonly fault: string | null;
  readonly place: { readonly chainage: number; readonly offset: number } | null;
};

/**
 * The figures of a strain stage without its walls.
 *
 * Units: as StrainOutcome. Valid: any result. Source: burland-1995.
 */
export function strainOutcome(result: BuildingResult): StrainOutcome {
  const strains = result.bracket?.strains.flat(2) ?? [0];
  const [low, high] = [Math.min(...strains), Math.max(...strains)];
  const worst = result.walls[result.governing];
  const zone = worst?.result.zones[worst.result.governingZone];
  return {
    strain: { low, central: result.strain, high },
    category: {
      low: categoryOfStrain(low),
      central: result.category,
      high: categoryOfStrain(high),
    },
    settlement: result.settlementMax,
    slope: result.slopeMax,
    rankin: result.rankin,
    breakpoint: result.breakpoint ?? null,
    isSettled: result.sensitivity?.settled ?? true,
    sensitiveTo: result.sensitivity?.input ?? null,
    governing:
      worst === undefined || zone === undefined
        ? null
        : {
            wall: worst.wall.name,
            isRow: worst.joined,
            mode: zone.mode,
            deflectionRatio: zone.deflectionRatio,
            horizontalStrain: zone.horizontalStrain,
          },
  };
}

function placeBeside(
  line: RunInputs['line'],
  { middle }: PreparedBuilding,
): BuildingOutcome['place'] {
  return line === null ? null : projectOntoPolyline(middle, line, chainages(line));
}

function notWorkedOut(
  { line }: RunInputs,
  prepared: PreparedBuilding,
  fault: string,
): BuildingOutcome {
  const { assumed } = prepared;
  return {
    stage: 3,
    heldBy: [],
    settlement: 0,
    slope: 0,
    strain: null,
    assumed,
    warnings: [],
    fault,
    place: placeBeside(line, prepared),
  };
}

/**
 * What a run finds of a building, with the result of the strain stage where it came so far.
 *
 * Units: as the parts. Valid: made by `workedBuilding`. Source: mair-taylor-burland-1996.
 */
export type WorkedBuilding = {
  readonly outcome: BuildingOutcome;
  readonly strain: BuildingResult | null;
};

function worked(
  { model, rules, limits, holds, line, moments = [ALL_COMPLETE] }: RunInputs,
  prepared: PreparedBuilding,
  rows: RowsByBuilding,
): WorkedBuilding {
  const screening = screenFootprint(model, prepared, rules, limits, moments);
  const { settlementMax: settlement, slopeMax: slope, warnings } = screening;
  const { assumed } = prepared;
  const heldAtOne = holdsAt(1, prepared.holds, holds).map(({ name }) => name);
  const place = placeBeside(line, prepared);
  const screened = { settlement, slope, assumed, fault: null, place };
  if (screening.passes && heldAtOne.length === 0) {
    return { outcome: { ...screened, stage: 1, heldBy: [], strain: null, warnings }, strain: null };
  }
  const joined = joinedWalls(prepared.id, prepared.walls, rows);
  const result = assessBuilding(model, prepared.walls, joined, rules, moments);
  const facts = withSensitivity(prepared.holds, prepared.scores, result.category);
  const heldBy = holdsAt(2, facts, holds).map(({ name }) => name);
  const passes = result.category < rules.leadingCategory && heldBy.length === 0;
  const outcome: BuildingOutcome = {
    ...screened,
    stage: passes ? 2 : 3,
    heldBy,
    strain: strainOutcome(result),
    warnings: [...new Set([...warnings, ...result.warnings])],
  };
  return { outcome, strain: result };
}

/**
 * Takes a building through screening and, where that does not let it go, through the strain stage.
 *
 * Units: as WorkedBuilding. Valid: a building whose levels contradict each other or the drives gets a
 * fault in words, not an error. Source: mair-taylor-burland-1996.
 */
export function workedBuilding(
  inputs: RunInputs,
  prepared: PreparedBuilding,
  rows: RowsByBuilding,
): WorkedBuilding {
  try {
    return worked(inputs, prepared, rows);
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    return { outcome: notWorkedOut(inputs, prepared, error.message), strain: null };
  }
}

/**
 * The same without the walls, which is what a run keeps.
 *
 * Units: as BuildingOutcome. Valid: as `workedBuilding`. Source: mair-taylor-burland-1996.
 */
export function outcomeOfBuilding(
  inputs: RunInputs,
  prepared: PreparedBuilding,
  rows: RowsByBuilding,
): BuildingOutcome {
  return workedBuilding(inputs, prepared, rows).outcome;
}
