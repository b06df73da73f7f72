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
 * The walls of one building that stand in rows, each as long as its row: a terrace bends as one.
 *
 * Units: m. Valid: `walls` in the order in which the rows were found. Source: [own]; joining façades
 * is [common].
 */
export function joinedWalls(
  buildingId: string,
  walls: readonly Wall[],
  rows: readonly Row[],
): JoinedWall[] {
  return rows.flatMap(({ segment, members }) =>
    members.flatMap((member) => {
      const own = member.buildingId === buildingId ? walls[member.wallIndex] : undefined;
      if (own === undefined) return [];
      return [{ wallIndex: member.wallIndex, wall: { ...own, name: `${own.name}, row`, segment } }];
    }),
  );
}
