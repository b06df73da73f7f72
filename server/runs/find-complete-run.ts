import type { Sequelize } from 'sequelize';
import { AppError } from '../errors.ts';
import { findRun, type FoundRun } from '../models/find-runs.ts';

/** One run of a scheme whose results can be looked at: before it is complete there are none. */
export async function findCompleteRun(
  database: Sequelize,
  schemeId: string,
  runId: string,
): Promise<FoundRun> {
  const run = await findRun(database, schemeId, runId);
  if (run.state === 'complete') return run;
  throw new AppError('conflict', 'This run is not complete yet, so there is nothing to show.');
}
