import type { Sequelize } from 'sequelize';
import type { z } from 'zod';
import type { PlanMaterial } from '../../shared/evidence/plan-material.ts';
import { boundingBox, type Box } from '../../shared/geometry/bounding-box.ts';
import { planMaterialSchema, MATERIAL_LIMITS } from '../../shared/schemas/evidence-material.ts';
import type { RunDetail } from '../../shared/schemas/runs.ts';
import { boxToLonLat } from '../crs/box-to-lon-lat.ts';
import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import { fromLonLat } from '../crs/from-lon-lat.ts';
import { AppError } from '../errors.ts';
import { findBackgroundInBox } from '../models/find-background-in-box.ts';
import type { LonLatBox } from '../models/find-buildings-in-box.ts';
import { findPlanBuildings } from '../models/find-plan-buildings.ts';
import { findContours } from '../models/run-contours.ts';
import type { Scheme } from '../models/scheme.ts';
import { planBackground } from './plan-background.ts';

const contoursSchema: z.ZodType<PlanMaterial['contours']> =
  planMaterialSchema.shape.material.shape.contours;

/** What is smaller than this share of a sheet is not seen on it. */
const UNSEEN = 0.001;

function meets(a: Box, b: Box): boolean {
  return a.west <= b.east && a.east >= b.west && a.south <= b.north && a.north >= b.south;
}

function refuseMany(count: number, most: number, what: string): void {
  if (count <= most) return;
  const many = most.toLocaleString('en-GB');
  const message = `More than ${many} ${what} stand on this sheet. Choose a larger scale or a smaller paper.`;
  throw new AppError('too-large', message);
}

async function buildingsIn(database: Sequelize, runId: string, box: LonLatBox) {
  const { buildings: most } = MATERIAL_LIMITS;
  const found = await findPlanBuildings(database, runId, box, most + 1);
  refuseMany(found.length, most, 'buildings');
  return found;
}

/** What plans of a run are drawn from: gives what there is within a piece of ground. */
export async function openMaterial(
  database: Sequelize,
  scheme: Scheme,
  { id: runId }: Pick<RunDetail, 'id'>,
): Promise<(box: Box) => Promise<PlanMaterial>> {
  const { definition } = await crsOfScheme(scheme);
  const toGrid = fromLonLat(definition);
  const text = await findContours(database, runId);
  const contours = contoursSchema
    .parse(JSON.parse(text))
    .map((contour) => ({ contour, box: boundingBox(contour.line) }));
  return async (box) => {
    const degrees = boxToLonLat(definition, box);
    const near = contours.flatMap((one) => (meets(one.box, box) ? [one.contour] : []));
    // nothing can stand where the grid does not reach
    if (degrees === null) return { buildings: [], background: [], contours: near };
    const least = UNSEEN * (degrees[3] - degrees[1]);
    const { background: most } = MATERIAL_LIMITS;
    const [buildings, background] = await Promise.all([
      buildingsIn(database, runId, degrees),
      findBackgroundInBox(database, scheme.id, degrees, { least, most }),
    ]);
    return {
      buildings,
      background: background.map((one) => planBackground(one, toGrid)),
      contours: near,
    };
  };
}
