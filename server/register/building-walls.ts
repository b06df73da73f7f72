import { facadesOf, type Facade } from '../../shared/building/facade.ts';
import { isSharedWall } from '../../shared/building/is-shared-wall.ts';
import { ROW_TOLERANCE } from '../../shared/building/row-tolerance.ts';
import { wallsOfFootprint } from '../../shared/building/walls-of-footprint.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { Neighbour } from '../models/find-neighbours.ts';

/** A wall of a building, and who stands against it. */
export type BuildingWall = {
  readonly facade: Facade;
  readonly sharedWith: readonly Neighbour[];
};

function facades(id: number, footprint: FootprintRings): Facade[] {
  const walls = footprint.flatMap((part) => wallsOfFootprint(part));
  return facadesOf({ id: String(id), walls });
}

/** The walls of a building, part by part and ring by ring, with the neighbours that share each. */
export function buildingWalls(
  id: number,
  footprint: FootprintRings,
  neighbours: readonly Neighbour[],
): BuildingWall[] {
  const around = neighbours.map((neighbour) => {
    return { neighbour, walls: facades(neighbour.id, neighbour.footprint) };
  });
  return facades(id, footprint).map((facade) => ({
    facade,
    sharedWith: around
      .filter(({ walls }) => walls.some((wall) => isSharedWall(facade, wall, ROW_TOLERANCE)))
      .map(({ neighbour }) => neighbour),
  }));
}
