import type { Sequelize } from 'sequelize';
import { AppError } from '../errors.ts';
import { findPrints, type FoundPrint } from '../models/prints.ts';

/** A print of a scheme; of another scheme it is not there. */
export async function keptPrint(
  database: Sequelize,
  schemeId: string,
  id: string,
): Promise<FoundPrint> {
  const [found] = await findPrints(database, schemeId, id);
  if (found === undefined) throw new AppError('not-found');
  return found;
}
