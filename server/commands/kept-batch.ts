import type { Sequelize, Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import { findBatches, type FoundBatch } from '../models/letter-batches.ts';

/** A batch of a scheme. */
export async function readBatch(
  database: Sequelize,
  schemeId: string,
  batchId: string,
  transaction: Transaction | null = null,
): Promise<FoundBatch> {
  const [batch] = await findBatches(database, schemeId, batchId, transaction);
  if (batch === undefined) throw new AppError('not-found');
  return batch;
}

/** The same, in a state from which it can move on; refused where somebody has moved it on already. */
export async function readBatchAs(
  database: Sequelize,
  schemeId: string,
  batchId: string,
  state: FoundBatch['state'],
  transaction: Transaction,
): Promise<FoundBatch> {
  const batch = await readBatch(database, schemeId, batchId, transaction);
  if (batch.state !== state) {
    throw new AppError('conflict', `These letters are ${batch.state} by now.`);
  }
  return batch;
}
