import type { Sequelize, Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import { findShownRun } from '../models/find-shown-run.ts';
import { Run } from '../models/run.ts';

/** The run that decisions are made on: the one that is shown, which is the one that was looked at. */
export async function shownRunOf(
  database: Sequelize,
  schemeId: string,
  seen: string,
  transaction: Transaction | null,
): Promise<Run> {
  const { runId } = await findShownRun(database, schemeId, transaction);
  if (runId !== seen) {
    const message = 'A newer run is shown by now. Look at what it found, then decide.';
    throw new AppError('conflict', message);
  }
  return Run.findByPk(runId, { transaction, rejectOnEmpty: true });
}
