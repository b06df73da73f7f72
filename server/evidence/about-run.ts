import type { AboutSheets } from '../../shared/evidence/sheet.ts';
import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import type { Scheme } from '../models/scheme.ts';
import { findCompleteRun } from '../runs/find-complete-run.ts';
import { runDetail } from '../runs/run-detail.ts';
import type { Services } from '../services.ts';
import { keyGround } from './key-ground.ts';

/** What every sheet of a complete run says of itself, whatever is printed of it. */
export async function aboutRun(
  { database }: Pick<Services, 'database'>,
  scheme: Scheme,
  runId: string,
): Promise<Omit<AboutSheets, 'fields'>> {
  await findCompleteRun(database, scheme.id, runId);
  const run = await runDetail({ database }, scheme.id, runId);
  const { code, name, definition } = await crsOfScheme(scheme);
  const place = { schemeId: scheme.id, definition };
  return {
    scheme: { name: scheme.name, crs: { code, name } },
    run,
    keyGround: await keyGround(database, place, run.design.line),
  };
}
