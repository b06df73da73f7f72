import { rowsByBuilding, type RowsByBuilding } from '../building/joined-walls.ts';
import { rows } from '../building/rows.ts';
import { outcomeOfBuilding, type BuildingOutcome, type RunInputs } from './outcome-of-building.ts';
import {
  preparedBuilding,
  type PreparedBuilding,
  type RegisterFacts,
} from './prepared-building.ts';

/**
 * The rows that prepared buildings stand in together.
 *
 * Units: m. Valid: ids differ. Source: as `rows`.
 */
export function rowsOfPrepared(buildings: readonly PreparedBuilding[]): RowsByBuilding {
  const standing = buildings.map(({ id, walls }) => ({
    id,
    walls: walls.map(({ segment }) => segment),
  }));
  return rowsByBuilding(rows(standing));
}

/**
 * Takes many buildings through a run. `beside` are buildings that stand in rows with them and are not
 * themselves asked for.
 *
 * Units: as BuildingOutcome, `groundLevel` m where neither a building nor a drive tells one. Valid: ids
 * differ; as long as whoever shares a wall is among `asked` or `beside`, the outcome of a building does not
 * depend on who else is; in the order asked. Source: mair-taylor-burland-1996.
 */
export function outcomesOfBuildings(
  inputs: RunInputs,
  groundLevel: number,
  asked: readonly RegisterFacts[],
  beside: readonly RegisterFacts[],
): { readonly id: string; readonly outcome: BuildingOutcome }[] {
  const prepare = (facts: RegisterFacts) => preparedBuilding(facts, inputs.model, groundLevel);
  const prepared = asked.map(prepare);
  const joined = rowsOfPrepared([...prepared, ...beside.map(prepare)]);
  return prepared.map((building) => ({
    id: building.id,
    outcome: outcomeOfBuilding(inputs, building, joined),
  }));
}
