import type { Sequelize, Transaction } from 'sequelize';
import type { RegisterFilter } from '../../shared/schemas/register.ts';
import { AppError } from '../errors.ts';
import { findShownRun } from '../models/find-shown-run.ts';
import { findVersions } from '../models/find-register-rows.ts';
import { meantIds } from './meant-ids.ts';
import type { VersionedBuilding } from './register-edits.ts';

type Meant = { readonly filter: RegisterFilter; readonly expected: number };

/** The buildings that a filter means, unless there are more or fewer than was said. */
export async function meantBuildings(
  database: Sequelize,
  schemeId: string,
  { filter, expected }: Meant,
  transaction: Transaction,
): Promise<VersionedBuilding[]> {
  const register = { schemeId, ...(await findShownRun(database, schemeId, transaction)) };
  const ids = await meantIds({ database, transaction }, register, filter);
  const found = await findVersions(database, ids, transaction);
  if (found.length === expected) return found;
  const message = `These are ${found.length} buildings now, not ${expected}. Look at them again.`;
  throw new AppError('conflict', message);
}
