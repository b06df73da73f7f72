import type { RegisterFilter } from '../../shared/schemas/register.ts';
import { isBesideColumn } from '../../shared/schemas/standing-columns.ts';
import { findRegisterIds } from '../models/find-register-order.ts';
import { registerCondition, type RegisterOf } from '../models/register-condition.ts';
import { unpackIds } from './packed-ids.ts';
import { splitFilter } from './split-filter.ts';
import { meantBeside, type Reading } from './values-beside.ts';

/** The numbers of the buildings that a filter means, ascending, as they are read now. */
export async function meantIds(
  reading: Reading,
  register: RegisterOf,
  filter: RegisterFilter,
): Promise<number[]> {
  const { rest, asked } = splitFilter(filter, isBesideColumn);
  const { database, transaction } = reading;
  const [ids, isMeant] = await Promise.all([
    findRegisterIds(database, registerCondition(register, rest), transaction),
    meantBeside(reading, register, asked),
  ]);
  return [...unpackIds(ids).sort().filter(isMeant)];
}
