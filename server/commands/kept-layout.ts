import type { Sequelize, Transaction } from 'sequelize';
import { AppError } from '../errors.ts';
import { findLayouts, type FoundLayout } from '../models/plan-layouts.ts';

/** A layout of a scheme; of another scheme it is not there. */
export async function keptLayout(
  database: Sequelize,
  schemeId: string,
  id: string,
  transaction: Transaction | null = null,
): Promise<FoundLayout> {
  const [found] = await findLayouts(database, schemeId, id, transaction);
  if (found === undefined) throw new AppError('not-found');
  return found;
}
