import type { Sequelize } from 'sequelize';
import { boundingBox } from '../../shared/geometry/bounding-box.ts';
import type { RegisterChange } from '../../shared/schemas/register-changes.ts';
import { overlapArea } from '../imports/overlap-area.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import { findBuildingEverKept } from '../models/find-building.ts';
import { findNeighbours } from '../models/find-neighbours.ts';
import { findFootprints } from '../models/footprints.ts';
import type { Scheme } from '../models/scheme.ts';

function outlined(rings: FootprintRings) {
  return { box: boundingBox(rings.flat(2)), rings };
}

/** The buildings that one lies over by more than a shared wall, the largest overlap first. */
export async function overlapsOf(
  database: Sequelize,
  scheme: Scheme,
  buildingId: number,
): Promise<NonNullable<RegisterChange['overlaps']>> {
  const building = await findBuildingEverKept(scheme.id, buildingId);
  const footprint = (await findFootprints(database, [buildingId])).get(buildingId) ?? [];
  const neighbours = await findNeighbours(database, building);
  return neighbours
    .map(({ id, reference, footprint: other }) => {
      return { id, reference, area: overlapArea(outlined(footprint), outlined(other)) };
    })
    .filter(({ area }) => area > 0)
    .sort((a, b) => b.area - a.area);
}
