import { planDistance } from '../geometry/plan-distance.ts';
import type { Segment } from '../geometry/point.ts';
import type { PolylinePart } from '../geometry/polyline-parts.ts';

/**
 * The walls of a building in plan, under the building's identity.
 *
 * Units: m. Valid: no two buildings share an id. Source: [own].
 */
export type BuildingWalls = { readonly id: string; readonly walls: readonly Segment[] };

/**
 * A wall of a building by the place that it has in the building's list.
 *
 * Units: none. Valid: an id and an index that were given. Source: [own].
 */
export type RowMember = { readonly buildingId: string; readonly wallIndex: number };

/**
 * One wall of one building as a part of a line.
 *
 * Units: m. Valid: length > 0. Source: [own].
 */
export type Facade = PolylinePart & RowMember;

/**
 * The façades of a building: its walls less those of no length.
 *
 * Units: m. Valid: any building. Source: [own].
 */
export function facadesOf({ id, walls }: BuildingWalls): Facade[] {
  const facades: Facade[] = [];
  for (const [wallIndex, { start, end }] of walls.entries()) {
    const length = planDistance(start, end);
    if (!(length > 0)) continue;
    const direction = [(end[0] - start[0]) / length, (end[1] - start[1]) / length] as const;
    facades.push({ start, end, length, direction, buildingId: id, wallIndex });
  }
  return facades;
}

/**
 * The same façade read from its other end.
 *
 * Units: m. Valid: any façade. Source: [own].
 */
export function reversedFacade(facade: Facade): Facade {
  const [x, y] = facade.direction;
  return { ...facade, start: facade.end, end: facade.start, direction: [-x, -y] };
}

/**
 * The order of façades: by building, then by place in its list. Ids go by code units, which every
 * engine orders alike.
 *
 * Units: none. Valid: for `sort`. Source: [own].
 */
export function compareMembers(a: RowMember, b: RowMember): number {
  if (a.buildingId !== b.buildingId) return a.buildingId < b.buildingId ? -1 : 1;
  return a.wallIndex - b.wallIndex;
}
