import type { Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import { RunState } from '../models/run-state.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import { lockScheme } from './lock-scheme.ts';

/** Where a run of a scheme stands, kept from being changed by others until the transaction ends. */
export async function lockRun(
  scheme: Scheme,
  runId: string,
  transaction: Transaction,
): Promise<RunState> {
  await lockScheme(scheme, transaction);
  const run = await Run.findOne({ where: { id: runId, schemeId: scheme.id }, transaction });
  if (run === null) throw new AppError('not-found');
  const lock = transaction.LOCK.UPDATE;
  return RunState.findByPk(runId, { transaction, lock, rejectOnEmpty: true });
}
