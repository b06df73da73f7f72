import type { Segment } from '../geometry/point.ts';
import { straightRuns } from '../geometry/straight-runs.ts';
import { facadeChains } from './facade-chains.ts';
import {
  compareMembers,
  facadesOf,
  type BuildingWalls,
  type Facade,
  type RowMember,
} from './facade.ts';
import { joinedBuildings } from './joined-buildings.ts';
import { ROW_TOLERANCE, type RowTolerance } from './row-tolerance.ts';

/**
 * A row of façades as one wall: the line from end to end, and its members in order along it.
 *
 * Units: m. Valid: members of at least two buildings. Source: [own].
 */
export type Row = { readonly segment: Segment; readonly members: readonly RowMember[] };

type Run = { readonly row: Row; readonly first: RowMember; readonly last: RowMember };

/** The row of a run, read from whichever end sorts first; none where it is all of one building. */
function runOf(facades: readonly Facade[]): Run[] {
  const [first] = facades;
  const last = facades.at(-1);
  if (first === undefined || last === undefined) return [];
  if (facades.every(({ buildingId }) => buildingId === first.buildingId)) return [];
  const members = facades.map(({ buildingId, wallIndex }) => ({ buildingId, wallIndex }));
  if (compareMembers(first, last) < 0) {
    return [{ row: { segment: { start: first.start, end: last.end }, members }, first, last }];
  }
  const segment = { start: last.end, end: first.start };
  return [{ row: { segment, members: members.reverse() }, first: last, last: first }];
}

/**
 * Rows of joined façades: walls of buildings that share a wall, one after the other with no more than
 * `offset` between their ends, each within `angle` of the line from end to end of the row and within
 * `offset` of it. Each row is as long as it can be and has at least two buildings. A curved terrace
 * gives rows that overlap, each straight, so that every house has the longest row that it can be in.
 *
 * Units: m. Valid: ids differ; the result does not depend on the order of the buildings; rows come in
 * the order of their first and last members. Source: [own]; joining façades is [common].
 */
export function rows(
  buildings: readonly BuildingWalls[],
  tolerance: RowTolerance = ROW_TOLERANCE,
): Row[] {
  const inOrder = [...buildings].sort((a, b) => (a.id < b.id ? -1 : 1));
  const facades = inOrder.map(facadesOf).filter((own) => own.length > 0);
  const chains = facadeChains(joinedBuildings(facades, tolerance), tolerance);
  return chains
    .flatMap((chain) => straightRuns(chain.facades, chain.closed, tolerance).flatMap(runOf))
    .sort((a, b) => compareMembers(a.first, b.first) || compareMembers(a.last, b.last))
    .map(({ row }) => row);
}
