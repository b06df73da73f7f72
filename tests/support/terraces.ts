import type { BuildingWalls } from '../../shared/building/facade.ts';
import type { PlanPoint, Segment } from '../../shared/geometry/point.ts';
import { polygonEdges } from '../../shared/geometry/polygon-edges.ts';

/** A building whose walls are the edges of a ring. */
export function building(id: string, ring: readonly PlanPoint[]): BuildingWalls {
  return { id, walls: polygonEdges(ring) };
}

/** A rectangular house: from (x, y), so wide to the east, so deep to the north. Wall 0 is its front. */
export function house(id: string, x: number, y: number, width = 5, depth = 8): BuildingWalls {
  return building(id, [
    [x, y],
    [x + width, y],
    [x + width, y + depth],
    [x, y + depth],
  ]);
}

/** Names that sort in the order of their numbers. */
export function houseName(number: number): string {
  return `house ${String(number).padStart(4, '0')}`;
}

/** Houses side by side along lines of front and back points; neighbours share their party walls. */
export function terrace(
  fronts: readonly PlanPoint[],
  backs: readonly PlanPoint[],
): BuildingWalls[] {
  return fronts.slice(0, -1).flatMap((front, k) => {
    const [nextFront, nextBack, back] = [fronts[k + 1], backs[k + 1], backs[k]];
    if (nextFront === undefined || nextBack === undefined || back === undefined) return [];
    return [building(houseName(k), [front, nextFront, nextBack, back])];
  });
}

/** Points along an arc of a circle about the origin, a turn apart. */
export function arcPoints(count: number, radius: number, turn: number): PlanPoint[] {
  return Array.from({ length: count }, (_, k): PlanPoint => [
    radius * Math.cos(k * turn),
    radius * Math.sin(k * turn),
  ]);
}

/** The wall that a member of a row stands for. */
export function wallOf(
  buildings: readonly BuildingWalls[],
  member: { readonly buildingId: string; readonly wallIndex: number },
): Segment {
  const wall = buildings.find(({ id }) => id === member.buildingId)?.walls[member.wallIndex];
  if (wall === undefined) throw new Error('A member is a wall that was given.');
  return wall;
}
