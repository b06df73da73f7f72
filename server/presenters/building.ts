import type {
  BuildingAnswer,
  BuildingRow,
  BuildingWall as BuildingWallAnswer,
} from '../../shared/schemas/buildings.ts';
import type { FootprintRings } from '../models/building-footprint.ts';
import type { Building } from '../models/building.ts';
import type { FoundBuilding } from '../models/search-buildings.ts';
import type { BuildingWall } from '../register/building-walls.ts';
import { presentValues } from './building-values.ts';

const LETTERS = 26;
const FIRST_LETTER = 65;
const DEGREES = 180 / Math.PI;

/** One row of a search for buildings. */
export function presentFoundBuilding(building: FoundBuilding): BuildingRow {
  const { id, reference, name, address, west, south, east, north } = building;
  return { id, reference, name, address, centre: [(west + east) / 2, (south + north) / 2] };
}

/** A, B and so on, then AA, AB. */
function letterOf(index: number): string {
  const last = String.fromCharCode(FIRST_LETTER + (index % LETTERS));
  return index < LETTERS ? last : letterOf(Math.floor(index / LETTERS) - 1) + last;
}

function presentWall({ facade, sharedWith }: BuildingWall, index: number): BuildingWallAnswer {
  const [east, north] = facade.direction;
  const bearing = Math.atan2(east, north) * DEGREES;
  return {
    letter: letterOf(index),
    start: [...facade.start],
    end: [...facade.end],
    length: facade.length,
    bearing: (bearing + 360) % 180,
    sharedWith: sharedWith.map(({ id, reference }) => ({ id, reference })),
  };
}

/** What leaves the server of a building of the register. */
export function presentBuilding(
  building: Building,
  footprint: FootprintRings,
  walls: readonly BuildingWall[],
): BuildingAnswer {
  return {
    ...presentFoundBuilding(building),
    ...presentValues(building),
    footprint: footprint.map((rings) => rings.map((ring) => ring.map(([e, n]) => [e, n]))),
    bounds: [building.west, building.south, building.east, building.north],
    walls: walls.map(presentWall),
  };
}
