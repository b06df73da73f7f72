import type { RunDetail } from '../../shared/schemas/runs.ts';
import { findRun } from '../models/find-runs.ts';
import { countResults } from '../models/run-results.ts';
import { Run } from '../models/run.ts';
import { presentRunDetail } from '../presenters/run.ts';
import type { Services } from '../services.ts';

/** A run with what was put in, and once it is complete with how many buildings stand where. */
export async function runDetail(
  { database }: Pick<Services, 'database'>,
  schemeId: string,
  runId: string,
): Promise<RunDetail> {
  const found = await findRun(database, schemeId, runId);
  const run = await Run.findByPk(runId, { rejectOnEmpty: true });
  const counts = found.state === 'complete' ? await countResults(database, runId) : null;
  return presentRunDetail(found, run, counts);
}
