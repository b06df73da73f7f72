import type { Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import { Alignment } from '../models/alignment.ts';
import type { Scheme } from '../models/scheme.ts';
import { lockScheme } from './lock-scheme.ts';

/** Reads an option of a scheme and keeps others from changing it until the transaction ends. */
export async function lockAlignment(
  scheme: Scheme,
  id: string,
  transaction: Transaction,
): Promise<Alignment> {
  await lockScheme(scheme, transaction);
  const found = await Alignment.findOne({ where: { id, schemeId: scheme.id }, transaction });
  if (found === null) throw new AppError('not-found');
  return found;
}
