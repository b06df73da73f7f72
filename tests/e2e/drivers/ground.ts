import { createGridProjection } from '../../../src/features/map/place/grid-projection.ts';
import { mapOf } from './plan.ts';
import type { Visitor } from './visitor.ts';

type Place = readonly [number, number];

/** The grid of the demo. */
const GRID = createGridProjection('+proj=utm +zone=31 +datum=WGS84 +units=m +no_defs');
/** The zoom at which a building is shown that was searched for, and the size of the world at zoom nought. */
const ZOOM = 17.5;
const WORLD = 512;

function mercator([longitude, latitude]: Place): Place {
  const size = WORLD * 2 ** ZOOM;
  const north = Math.log(Math.tan(Math.PI / 4 + (latitude * Math.PI) / 360));
  return [((longitude + 180) / 360) * size, (0.5 - north / (2 * Math.PI)) * size];
}

/** What the server says of a building. */
export type KnownBuilding = {
  readonly id: number;
  readonly reference: string;
  readonly bounds: readonly [number, number, number, number];
  readonly footprint: readonly (readonly (readonly Place[])[])[];
};

/** The building that the address of the plan names. */
export function buildingShown({ page }: Visitor): Promise<KnownBuilding> {
  return page.evaluate(async (): Promise<KnownBuilding> => {
    const [, scheme] = /schemes\/([^/]+)/.exec(location.href) ?? [];
    const id = new URLSearchParams(location.search).get('building') ?? '';
    const answer = await fetch(`/api/schemes/${scheme ?? ''}/buildings/${id}`);
    return answer.json() as Promise<KnownBuilding>;
  });
}

/** Presses the map where the grid has a place, while a building that was searched for is in its middle. */
export async function pressGround(
  visitor: Visitor,
  { bounds: [west, south, east, north] }: KnownBuilding,
  place: Place,
): Promise<void> {
  const box = await mapOf(visitor).boundingBox();
  const lonLat = GRID.toLonLat(place);
  if (box === null || lonLat === null) throw new Error('There is no such place on the map.');
  const [middle, wanted] = [mercator([(west + east) / 2, (south + north) / 2]), mercator(lonLat)];
  const [x, y] = [wanted[0] - middle[0], wanted[1] - middle[1]];
  await visitor.page.mouse.move(box.x + box.width / 2 + x - 1, box.y + box.height / 2 + y);
  await visitor.page.mouse.click(box.x + box.width / 2 + x, box.y + box.height / 2 + y);
}
