import type { Segment } from '../geometry/point.ts';
import type { Row } from './rows.ts';
import type { Wall } from './wall.ts';

/**
 * A wall of a building lengthened to the whole row that it stands in, with the building's own height,
 * levels and stiffness.
 *
 * Units: m. Valid: made by `joinedWalls`. Source: [own].
 */
export type JoinedWall = { readonly wallIndex: number; readonly wall: Wall };

/**
 * The rows that each building has a wall in, by building.
 *
 * Units: m. Valid: made by `rowsByBuilding`. Source: [own].
 */
export type RowsByBuilding = ReadonlyMap<
  string,
  readonly { readonly wallIndex: number; readonly segment: Segment }[]
>;

/**
 * Sorts rows by building, once for a whole town.
 *
 * Units: m. Valid: any rows. Source: [own].
 */
export function rowsByBuilding(rows: readonly Row[]): RowsByBuilding {
  const found = new Map<string, { wallIndex: number; segment: Segment }[]>();
  for (const { segment, members } of rows) {
    for (const { buildingId, wallIndex } of members) {
      const own = found.get(buildingId) ?? [];
      own.push({ wallIndex, segment });
      found.set(buildingId, own);
    }
  }
  return found;
}

/**
 * The walls of one building that stand in rows, each as long as its row: a terrace bends as one.
 *
 * Units: m. Valid: `walls` in the order in which the rows were found. Source: [own]; joining façades
 * is [common].
 */
export function joinedWalls(
  buildingId: string,
  walls: readonly Wall[],
  rows: RowsByBuilding,
): JoinedWall[] {
  return (rows.get(buildingId) ?? []).flatMap(({ wallIndex, segment }) => {
    const own = walls[wallIndex];
    if (own === undefined) return [];
    return [{ wallIndex, wall: { ...own, name: `${own.name}, row`, segment } }];
  });
}
