import type { Response } from 'express';
import type { RunFacts } from '../../../shared/schemas/runs.ts';
import { boxToLonLat } from '../../crs/box-to-lon-lat.ts';
import { crsOfScheme } from '../../crs/crs-of-scheme.ts';
import { findRunOutlines } from '../../models/find-run-outlines.ts';
import { findRun } from '../../models/find-runs.ts';
import { findContours } from '../../models/run-contours.ts';
import { Run } from '../../models/run.ts';
import type { Scheme } from '../../models/scheme.ts';
import { presentRunDetail } from '../../presenters/run.ts';
import { runBuildingAlone } from '../../runs/run-building.ts';
import type { Services } from '../../services.ts';
import { historyOfBuilding } from './history-of-building.ts';
import { sheetPlanFrame } from './plan-frame-of-sheet.ts';
import type { Outline, SheetMaterial } from './sheet-material.ts';

type Place = { readonly runId: string; readonly buildingId: number };

/** Who asks for a sheet of a scheme, and where it goes. */
type SheetCall = { readonly services: Services; readonly scheme: Scheme; readonly res: Response };

async function neighboursOf(
  { services, scheme }: SheetCall,
  { runId, buildingId }: Place,
  { parts }: RunFacts,
): Promise<readonly Outline[]> {
  const { definition } = await crsOfScheme(scheme);
  const box = boxToLonLat(definition, sheetPlanFrame(parts).box);
  if (box === null) return [];
  const found = await findRunOutlines(services.database, scheme.id, runId, box);
  return found.filter(({ id }) => id !== buildingId).map((one) => one.parts);
}

async function materialOf(
  call: SheetCall,
  place: Place,
  samples: number | null,
): Promise<SheetMaterial> {
  const { services, scheme } = call;
  const { runId, buildingId } = place;
  // whether it is there, before anything else of it is asked for
  const found = await findRun(services.database, scheme.id, runId);
  const [run, building, contours] = await Promise.all([
    Run.findByPk(runId, { rejectOnEmpty: true }),
    runBuildingAlone(services, scheme.id, place),
    findContours(services.database, runId),
  ]);
  const option = { schemeId: scheme.id, optionId: run.alignmentId };
  return {
    scheme: { name: scheme.name },
    run: presentRunDetail(found, run, null),
    building,
    neighbours: await neighboursOf(call, place, building.facts),
    contours,
    samples,
    history: await historyOfBuilding(services.database, option, buildingId),
    printedAt: new Date().toISOString(),
  };
}

function fileName({ run, building }: SheetMaterial): string {
  const reference = building.facts.reference
    .normalize('NFD')
    .replaceAll(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/gi, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60);
  return `sheet-${reference || building.facts.id}-run-${run.number}.pdf`;
}

/**
 * Sends the sheet of one building in one run, with a sampled run where its seed is given; it is worked out
 * and drawn beside the event loop.
 */
export async function sendSheet(
  call: SheetCall,
  place: Place,
  samples: number | null,
): Promise<void> {
  const { services, res } = call;
  const material = await materialOf(call, place, samples);
  const bytes = await services.runs.compute({ kind: 'sheet', material });
  res.attachment(fileName(material)).type('application/pdf');
  res.end(bytes);
}
