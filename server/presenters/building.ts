import type { BuildingAnswer, BuildingRow } from '../../shared/schemas/buildings.ts';
import type { Building } from '../models/building.ts';
import type { FoundBuilding } from '../models/search-buildings.ts';

/** One row of a search for buildings. */
export function presentFoundBuilding(building: FoundBuilding): BuildingRow {
  const { id, reference, name, address, west, south, east, north } = building;
  return { id, reference, name, address, centre: [(west + east) / 2, (south + north) / 2] };
}

/** What leaves the server of a building of the register. */
export function presentBuilding(building: Building): BuildingAnswer {
  return {
    ...presentFoundBuilding(building),
    use: building.use,
    storeys: building.storeys,
    eavesHeight: building.eavesHeight,
    groundLevel: building.groundLevel,
    foundingLevel: building.foundingLevel,
    foundation: building.foundation,
    construction: building.construction,
    listedGrade: building.listedGrade,
    condition: building.condition,
    footprint: building.footprint.map((rings) => rings.map((ring) => ring.map(([e, n]) => [e, n]))),
    bounds: [building.west, building.south, building.east, building.north],
  };
}
