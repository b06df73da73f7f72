import type { Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import type { Scheme } from '../models/scheme.ts';

/**
 * Reads a scheme anew and keeps others from changing it until the transaction ends. Refuses an archived
 * one: it may have been archived since the request began.
 */
export async function lockScheme(scheme: Scheme, transaction: Transaction): Promise<void> {
  await scheme.reload({ transaction, lock: transaction.LOCK.UPDATE });
  if (scheme.archivedAt !== null) throw new AppError('archived');
}
