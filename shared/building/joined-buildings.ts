import Flatbush from 'flatbush';
import { boundingBox, type Box } from '../geometry/bounding-box.ts';
import type { Segment } from '../geometry/point.ts';
import type { Facade } from './facade.ts';
import { isSharedWall } from './is-shared-wall.ts';
import type { RowTolerance } from './row-tolerance.ts';

type Building = readonly Facade[];

function isNear({ start, end }: Segment, box: Box, reach: number): boolean {
  return (
    Math.max(start[0], end[0]) >= box.west - reach &&
    Math.min(start[0], end[0]) <= box.east + reach &&
    Math.max(start[1], end[1]) >= box.south - reach &&
    Math.min(start[1], end[1]) <= box.north + reach
  );
}

type Boxed = { readonly building: Building; readonly box: Box };

function areJoined(a: Boxed, b: Boxed, tolerance: RowTolerance): boolean {
  const ofA = a.building.filter((facade) => isNear(facade, b.box, tolerance.offset));
  const ofB = b.building.filter((facade) => isNear(facade, a.box, tolerance.offset));
  return ofA.some((one) => ofB.some((other) => isSharedWall(one, other, tolerance)));
}

/**
 * Which buildings share a wall, as pairs of their façade lists, the earlier list first.
 *
 * Units: m. Valid: a list that is not empty for each building. Source: [own].
 */
export function joinedBuildings(
  buildings: readonly Building[],
  tolerance: RowTolerance,
): [Building, Building][] {
  if (buildings.length === 0) return [];
  const boxed = buildings.map((building) => ({
    building,
    box: boundingBox(building.flatMap(({ start, end }) => [start, end])),
  }));
  const index = new Flatbush(boxed.length);
  for (const { box } of boxed) index.add(box.west, box.south, box.east, box.north);
  index.finish();
  const reach = tolerance.offset;
  const pairs: [Building, Building][] = [];
  for (const [position, one] of boxed.entries()) {
    const { west, south, east, north } = one.box;
    const found = index
      .search(west - reach, south - reach, east + reach, north + reach, (other) => other > position)
      .sort((a, b) => a - b);
    for (const other of found.flatMap((k) => boxed[k] ?? [])) {
      if (areJoined(one, other, tolerance)) pairs.push([one.building, other.building]);
    }
  }
  return pairs;
}
