import type { Sequelize } from 'sequelize';
import type { PlanBackground } from '../../shared/evidence/plan-material.ts';
import { boundingBox } from '../../shared/geometry/bounding-box.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import { thinnedLine } from '../../shared/ground/thinned-line.ts';
import { boxToLonLat } from '../crs/box-to-lon-lat.ts';
import { fromLonLat } from '../crs/from-lon-lat.ts';
import { findBackgroundInBox } from '../models/find-background-in-box.ts';
import { planBackground } from './plan-background.ts';

/** How far beyond the line a key plan reaches, as a share of its extent. */
const AROUND = 0.5;
/** What a key plan, a few centimetres wide, cannot show of its extent. */
const UNSEEN = 0.003;
/** The largest; more could not be told apart. */
const MOST = 300;
const MOST_POINTS = 20_000;

function thinned(line: readonly PlanPoint[], slack: number): PlanPoint[] {
  return thinnedLine(line.map((point) => ({ point, slack })));
}

/** As many of the largest as keep to the points that a sheet may carry. */
function bounded(ground: readonly PlanBackground[]): PlanBackground[] {
  let points = 0;
  return ground.filter(({ lines }) => {
    points += lines.reduce((sum, line) => sum + line.length, 0);
    return points <= MOST_POINTS;
  });
}

/** The water of the ground round the whole of a line, as coarse as a key plan shows it. */
export async function keyGround(
  database: Sequelize,
  { schemeId, definition }: { readonly schemeId: string; readonly definition: string },
  line: readonly PlanPoint[],
): Promise<PlanBackground[]> {
  const { west, south, east, north } = boundingBox(line);
  const extent = Math.max(east - west, north - south);
  const reach = AROUND * extent;
  const around = { west: west - reach, south: south - reach, east: east + reach, north: north + reach }; // prettier-ignore
  const degrees = boxToLonLat(definition, around);
  if (degrees === null) return [];
  const least = UNSEEN * (degrees[3] - degrees[1]);
  const wanted = { layer: 'water', least, most: MOST } as const;
  const found = await findBackgroundInBox(database, schemeId, degrees, wanted);
  const toGrid = fromLonLat(definition);
  const ground = found.map((one) => {
    const { lines, ...rest } = planBackground(one, toGrid);
    return { ...rest, lines: lines.map((each) => thinned(each, UNSEEN * extent)) };
  });
  return bounded(ground);
}
