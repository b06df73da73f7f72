import type { Category } from '../damage/categories.ts';
import type { RankinClass } from '../damage/rankin.ts';
import type { Mode } from '../building/curvature-runs.ts';
import { lossFactorsAt } from '../ground/loss-factors-at.ts';
import {
  atPosition,
  CENTRAL,
  FIVE_POSITIONS,
  isRange,
  type FivePosition,
} from '../numerics/range.ts';
import type { AssessCase } from '../schemas/assess-case.ts';
import type { Warning } from '../warnings.ts';
import { assessWall, resultOfWall, type AssessedZone, type WallResult } from './assess-wall.ts';
import {
  bracketCategories,
  bracketOfWall,
  fieldsOverTroughWidth,
  LOSS_LEVELS,
  type Bracket,
} from './bracket.ts';
import { breakpointOfWall, LARGEST_VOLUME_LOSS, type Breakpoint } from './breakpoint-of-wall.ts';
import { loadedProfile } from './loaded-profile.ts';
import { wallOfCase, type CaseModel } from './model-of-case.ts';
import { sensitivityOf, type BracketInput } from './sensitivity.ts';

const POSITION_NAMES = ['low', 'low to central', 'central', 'central to high', 'high'] as const;

/**
 * A zone as an assessed case prints it.
 *
 * Units: start and end m from the wall's start, the rest m/m. Valid: finite. Source: [own].
 */
export type CaseZone = Pick<
  AssessedZone,
  | 'mode'
  | 'start'
  | 'end'
  | 'deflectionRatio'
  | 'horizontalStrain'
  | 'bendingStrain'
  | 'diagonalStrain'
  | 'strain'
  | 'averageHorizontalStrain'
  | 'peakHorizontalStrain'
>;

/**
 * A wall as an assessed case prints it; the last five stand only where a range was given.
 *
 * Units: m and m/m. Valid: never NaN. Source: [own].
 */
export type CaseWallResult = {
  readonly name: string;
  readonly settlementMax: number;
  readonly slopeMax: number;
  readonly zones: readonly CaseZone[];
  readonly strain: number;
  readonly category: Category;
  readonly rankin: RankinClass;
  readonly tilt: number;
  readonly angularDistortion: number;
  readonly warnings: readonly Warning[];
  readonly bracket?: ReturnType<typeof printedBracket>;
  readonly breakpoint?: ReturnType<typeof printedBreakpoint>;
  readonly reserve?: { readonly overCentral: number; readonly overHigh: number } | null;
  readonly settled?: boolean;
  readonly governing?: {
    readonly zone: number | null;
    readonly mode: Mode | null;
    readonly strain: 'bending' | 'diagonal' | null;
    readonly input: BracketInput | null;
  };
};

function printedZone(zone: AssessedZone): CaseZone {
  return {
    mode: zone.mode,
    start: zone.start,
    end: zone.end,
    deflectionRatio: zone.deflectionRatio,
    horizontalStrain: zone.horizontalStrain,
    bendingStrain: zone.bendingStrain,
    diagonalStrain: zone.diagonalStrain,
    strain: zone.strain,
    averageHorizontalStrain: zone.averageHorizontalStrain,
    peakHorizontalStrain: zone.peakHorizontalStrain,
  };
}

function printedBracket(bracket: Bracket) {
  return {
    volumeLoss: LOSS_LEVELS,
    troughWidth: POSITION_NAMES,
    eOverG: bracket.eOverG,
    strains: LOSS_LEVELS.map((_, v) =>
      FIVE_POSITIONS.map((k) => Math.max(...bracket.strains.map((level) => level[v]?.[k] ?? 0))),
    ),
    categories: bracketCategories(bracket),
  };
}

/** K at the governing position, where K is an input and the same all along the drive. */
function troughWidthOf(
  { model }: CaseModel,
  drive: number,
  position: FivePosition,
): number | undefined {
  const found = model.drives[drive]?.troughWidth;
  return found === undefined ? undefined : atPosition(found, position);
}

function printedBreakpoint(prepared: CaseModel, found: Breakpoint | undefined) {
  if (found === undefined) return { reached: false, upTo: LARGEST_VOLUME_LOSS } as const;
  return {
    reached: true,
    factor: found.factor,
    volumeLoss: found.volumeLoss,
    drive: prepared.model.drives[found.drive]?.name ?? '',
    troughWidth: POSITION_NAMES[found.position],
    troughWidthOfDrive: troughWidthOf(prepared, found.drive, found.position),
    eOverG: found.eOverG,
  } as const;
}

function printedWall(name: string, result: WallResult): CaseWallResult {
  return {
    name,
    settlementMax: result.settlementMax,
    slopeMax: result.slopeMax,
    zones: result.zones.map(printedZone),
    strain: result.strain,
    category: result.category,
    rankin: result.rankin,
    tilt: result.tilt,
    angularDistortion: result.angularDistortion,
    warnings: result.warnings,
  };
}

/**
 * Assesses one wall of a case: central values, and bracket, breakpoint and reserve where any range was
 * given.
 *
 * Units: m and m/m. Valid: throws as `levelField`. Source: the parts cite theirs.
 */
export function assessCaseWall(
  prepared: CaseModel,
  input: AssessCase['walls'][number],
): CaseWallResult {
  const { model, rules, faces } = prepared;
  const wall = wallOfCase(input, prepared.groundLevel);
  if (!prepared.hasRanges && !isRange(wall.eOverG)) {
    return printedWall(wall.name, assessWall(model, wall, rules, faces));
  }
  const fields = fieldsOverTroughWidth(model, wall, rules, faces);
  const central = fields[CENTRAL];
  if (central === undefined) return printedWall(wall.name, assessWall(model, wall, rules, faces));
  const loaded = loadedProfile(central, lossFactorsAt(model, 'central'));
  const result = resultOfWall(central, loaded, wall, rules);
  const bracket = bracketOfWall(model, fields, wall, rules);
  const breakpoint = breakpointOfWall(model, fields, wall, rules, faces);
  const { settled, input: moves } = sensitivityOf(bracket);
  const governing = result.zones[result.governingZone];
  const warnings = new Set([...result.warnings, ...fields.flatMap((f) => f.field.warnings)]);
  return {
    ...printedWall(wall.name, { ...result, warnings: [...warnings] }),
    bracket: printedBracket(bracket),
    breakpoint: printedBreakpoint(prepared, breakpoint),
    reserve:
      breakpoint === undefined
        ? null
        : { overCentral: breakpoint.reserveOverCentral, overHigh: breakpoint.reserveOverHigh },
    settled,
    governing: {
      zone: governing === undefined ? null : result.governingZone,
      mode: governing?.mode ?? null,
      strain: governing?.governing ?? null,
      input: moves,
    },
  };
}
