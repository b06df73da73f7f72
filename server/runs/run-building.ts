import type { z } from 'zod';
import { caseOfBuilding } from '../../shared/assessment/case-of-building.ts';
import { preparedBuilding } from '../../shared/assessment/prepared-building.ts';
import { runInputs } from '../../shared/assessment/run-inputs.ts';
import type { AssessCase } from '../../shared/schemas/assess-case.ts';
import { runBuildingSchema, type RunBuilding } from '../../shared/schemas/runs.ts';
import { AppError } from '../errors.ts';
import { findNeighboursText, findRunBuilding } from '../models/find-run-building.ts';
import { findResult } from '../models/run-results.ts';
import { Run } from '../models/run.ts';
import type { PackedIds } from '../register/packed-ids.ts';
import type { Services } from '../services.ts';
import { runOrder } from './run-order.ts';

type Place = { readonly runId: string; readonly buildingId: number };

async function findOwnRun(schemeId: string, { runId }: Place): Promise<Run> {
  const run = await Run.findOne({ where: { id: runId, schemeId } });
  if (run === null) throw new AppError('not-found');
  return run;
}

/** What it takes to work a building out again, whoever comes before and after it. */
const aloneSchema = runBuildingSchema.omit({ previous: true, next: true });

export type RunBuildingAlone = z.infer<typeof aloneSchema>;

async function buildingOf(
  { database, runs }: Pick<Services, 'database' | 'runs'>,
  { id: runId, design, rules }: Run,
  buildingId: number,
): Promise<RunBuildingAlone> {
  const [found, result, neighbours] = await Promise.all([
    findRunBuilding(database, runId, buildingId),
    findResult(database, runId, buildingId),
    findNeighboursText(database, runId, buildingId),
  ]);
  if (result === undefined) throw new AppError('not-found');
  const asked = { kind: 'rows', design, rules, id: String(buildingId), neighbours } as const;
  return aloneSchema.parse({ ...found, result, rows: await runs.compute(asked) });
}

/** A building of a run as it is on record, whoever comes before and after it. */
export async function runBuildingAlone(
  services: Pick<Services, 'database' | 'runs'>,
  schemeId: string,
  place: Place,
): Promise<RunBuildingAlone> {
  return buildingOf(services, await findOwnRun(schemeId, place), place.buildingId);
}

/** Who comes before and after a building in an order; null at either end. */
function besideIn(order: PackedIds, id: number): Pick<RunBuilding, 'previous' | 'next'> {
  const place = order.indexOf(id);
  if (place === null) return { previous: null, next: null };
  const [previous = null] = order.slice(Math.max(0, place - 1), place);
  const [next = null] = order.slice(place + 1, place + 2);
  return { previous, next };
}

/**
 * One building of a run with all that it takes to work it out again: what was known of it and the rows that
 * it stood in; and who comes before and after it.
 */
export async function runBuilding(
  services: Pick<Services, 'database' | 'runs' | 'tiles'>,
  schemeId: string,
  place: Place,
): Promise<RunBuilding> {
  const { runId, buildingId } = place;
  const run = await findOwnRun(schemeId, place);
  const [building, order] = await Promise.all([
    buildingOf(services, run, buildingId),
    runOrder(services, runId),
  ]);
  return runBuildingSchema.parse({ ...building, ...besideIn(order, buildingId) });
}

/** One building of a run as a case that anyone can work out again with the command for cases. */
export async function runBuildingCase(
  services: Pick<Services, 'database' | 'runs'>,
  schemeId: string,
  place: Place,
): Promise<AssessCase> {
  const run = await findOwnRun(schemeId, place);
  const { facts, rows } = await buildingOf(services, run, place.buildingId);
  const inputs = runInputs(run.design, run.rules);
  const building = preparedBuilding(facts, inputs.model, run.design.groundLevel);
  return caseOfBuilding(inputs, run.design, building, new Map([[building.id, rows]]));
}
