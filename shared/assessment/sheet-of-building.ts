import { joinedWalls, type RowsByBuilding } from '../building/joined-walls.ts';
import { MethodError } from '../method-error.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import type { RuleSet } from '../schemas/rules.ts';
import { assessBuilding, type BuildingResult } from './assess-building.ts';
import { ALL_COMPLETE } from './moment.ts';
import { workedBuilding, type BuildingOutcome, type RunInputs } from './outcome-of-building.ts';
import {
  preparedBuilding,
  type PreparedBuilding,
  type RegisterFacts,
} from './prepared-building.ts';
import { runInputs } from './run-inputs.ts';

/**
 * A building of a run worked out again with everything that its figures rest on. `strain` is the strain
 * stage of all its walls, also where screening lets the building go; null where the method refuses.
 *
 * Units: as the parts. Valid: made by `sheetOfBuilding`. Source: mair-taylor-burland-1996, burland-1995.
 */
export type BuildingSheet = {
  readonly inputs: RunInputs;
  readonly prepared: PreparedBuilding;
  readonly outcome: BuildingOutcome;
  readonly strain: BuildingResult | null;
};

function strainOf(
  { model, rules }: RunInputs,
  prepared: PreparedBuilding,
  rows: RowsByBuilding,
): BuildingResult | null {
  try {
    const joined = joinedWalls(prepared.id, prepared.walls, rows);
    return assessBuilding(model, prepared.walls, joined, rules, [ALL_COMPLETE]);
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    return null;
  }
}

/**
 * Works a building of a run out again, by the same functions as the run.
 *
 * Units: m. Valid: design, rules, facts and rows as the run had them; throws as `runInputs`.
 * Source: mair-taylor-burland-1996.
 */
export function sheetOfBuilding(
  design: AlignmentDesign,
  rules: RuleSet,
  facts: RegisterFacts,
  rows: RowsByBuilding,
): BuildingSheet {
  const inputs = runInputs(design, rules);
  const prepared = preparedBuilding(facts, inputs.model, design.groundLevel);
  const { outcome, strain } = workedBuilding(inputs, prepared, rows);
  return { inputs, prepared, outcome, strain: strain ?? strainOf(inputs, prepared, rows) };
}
