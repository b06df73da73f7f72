import { assessCaseWall, type CaseWallResult } from '../../shared/assessment/assess-case-wall.ts';
import { modelOfCase } from '../../shared/assessment/model-of-case.ts';
import { openWall, type OpenedWall } from '../../shared/assessment/open-wall.ts';
import { strainOutcome } from '../../shared/assessment/outcome-of-building.ts';
import { resultOfOutcome } from '../../shared/assessment/result-of-outcome.ts';
import { sheetOfBuilding } from '../../shared/assessment/sheet-of-building.ts';
import { categoryOfStrain } from '../../shared/damage/category-of-strain.ts';
import { rankinClass } from '../../shared/damage/rankin.ts';
import type { AssessCase } from '../../shared/schemas/assess-case.ts';
import type { RunBuilding, RunDetail, RunResult } from '../../shared/schemas/runs.ts';

/** The figures of the strain stage that a record has. */
const OF_STRAIN = [
  ...['strainLow', 'strain', 'strainHigh', 'categoryLow', 'category', 'categoryHigh'],
  ...['rankin', 'wallSettlement', 'wallSlope', 'breakpoint', 'breakpointVolumeLoss', 'reserve'],
  ...['reserveOverHigh', 'governingWall', 'mode', 'deflectionRatio', 'horizontalStrain'],
];

type Figures = {
  /** As a record has them. */
  readonly strain: Partial<RunResult>;
  /** The worst of all walls, by volume loss and K. */
  readonly bracket: readonly (readonly number[])[];
  readonly walls: readonly unknown[];
};

type Cells = readonly (readonly number[])[];

function worstCells(all: readonly Cells[]): Cells {
  const [first = []] = all;
  return first.map((row, v) => row.map((_, k) => Math.max(...all.map((cells) => cells[v]?.[k] ?? 0)))); // prettier-ignore
}

type Zone = OpenedWall['result']['zones'][number] | CaseWallResult['zones'][number];

function shownZone(zone: Zone) {
  return {
    ...{ mode: zone.mode, start: zone.start, end: zone.end, strain: zone.strain },
    ...{ deflectionRatio: zone.deflectionRatio, horizontalStrain: zone.horizontalStrain },
    ...{ bendingStrain: zone.bendingStrain, diagonalStrain: zone.diagonalStrain },
  };
}

type Wall = Omit<CaseWallResult, 'zones' | 'warnings'> & { readonly zones: readonly Zone[] };

function shownWall({ name, strain, category, rankin, tilt, angularDistortion, ...wall }: Wall) {
  return {
    ...{ name, strain, category, rankin, tilt, angularDistortion },
    ...{ settlementMax: wall.settlementMax, slopeMax: wall.slopeMax },
    zones: wall.zones.map(shownZone),
  };
}

function wallOfSheet({ wall, result, bracket, breakpoint }: OpenedWall) {
  return {
    ...shownWall({ ...result, name: wall.name }),
    bracket: worstCells(bracket.strains),
    breakpoint: breakpoint === undefined ? null : [breakpoint.factor, breakpoint.volumeLoss],
  };
}

function wallOfCase(wall: CaseWallResult): ReturnType<typeof wallOfSheet> {
  const { bracket, breakpoint } = wall;
  return {
    ...shownWall(wall),
    bracket: bracket?.strains ?? [],
    breakpoint: breakpoint?.reached === true ? [breakpoint.factor, breakpoint.volumeLoss] : null,
  };
}

/** All that a sheet shows of the strain stage, worked out from the building's case alone. */
export function figuresOfCase({ walls, ...others }: AssessCase): Figures {
  const prepared = modelOfCase(others);
  const worked = walls.map((wall) => assessCaseWall(prepared, wall));
  const worst = worked.reduce((a, b) => (b.strain > a.strain ? b : a));
  const bracket = worstCells(worked.map((wall) => wall.bracket?.strains ?? []));
  const [low, high] = [Math.min(...bracket.flat()), Math.max(...bracket.flat())];
  const broken = worked
    .flatMap(({ breakpoint, reserve }) =>
      breakpoint?.reached === true ? [{ ...breakpoint, reserve }] : [],
    )
    .sort((a, b) => a.factor - b.factor)[0];
  const zone = worst.zones[worst.governing?.zone ?? -1];
  const [wallSettlement, wallSlope] = [
    Math.max(...worked.map(({ settlementMax }) => settlementMax)),
    Math.max(...worked.map(({ slopeMax }) => slopeMax)),
  ];
  return {
    strain: {
      ...{ strainLow: low, strain: worst.strain, strainHigh: high },
      categoryLow: categoryOfStrain(low),
      category: worst.category,
      categoryHigh: categoryOfStrain(high),
      rankin: rankinClass(wallSlope, wallSettlement),
      ...{ wallSettlement, wallSlope },
      breakpoint: broken?.factor ?? null,
      breakpointVolumeLoss: broken?.volumeLoss ?? null,
      reserve: broken?.reserve?.overCentral ?? null,
      reserveOverHigh: broken?.reserve?.overHigh ?? null,
      governingWall: zone === undefined ? null : worst.name,
      mode: zone?.mode ?? null,
      deflectionRatio: zone?.deflectionRatio ?? null,
      horizontalStrain: zone?.horizontalStrain ?? null,
    },
    bracket,
    walls: worked.map(wallOfCase),
  };
}

/** The same as a sheet works it out, and what it would have recorded. */
export function figuresOfSheet(
  { design, rules }: Pick<RunDetail, 'design' | 'rules'>,
  { facts, rows }: Pick<RunBuilding, 'facts' | 'rows'>,
): Figures & { readonly record: RunResult } {
  const sheet = sheetOfBuilding(design, rules, facts, new Map([[facts.id, rows]]));
  const { outcome, strain, inputs } = sheet;
  if (strain === null)
    throw new Error(`The method refuses ${facts.reference}: ${outcome.fault ?? ''}`);
  const shown = resultOfOutcome({ ...outcome, strain: strainOutcome(strain) });
  return {
    record: resultOfOutcome(outcome),
    strain: Object.fromEntries(Object.entries(shown).filter(([name]) => OF_STRAIN.includes(name))),
    bracket: worstCells(strain.bracket?.strains ?? []),
    walls: strain.walls.map(({ wall }) =>
      wallOfSheet(openWall(inputs.model, wall, inputs.rules, [])),
    ),
  };
}
