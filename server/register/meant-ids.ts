import type { RegisterFilter } from '../../shared/schemas/register.ts';
import { findRegisterIds } from '../models/find-register-order.ts';
import { registerCondition, type RegisterOf } from '../models/register-condition.ts';
import { unpackIds } from './packed-ids.ts';
import { splitFilter, standingAs, type Reading } from './standings.ts';

/** The numbers of the buildings that a filter means, ascending, as they are read now. */
export async function meantIds(
  reading: Reading,
  register: RegisterOf,
  filter: RegisterFilter,
): Promise<number[]> {
  const { rest, standing } = splitFilter(filter);
  const { database, transaction } = reading;
  const condition = registerCondition(register, rest);
  const ids = unpackIds(await findRegisterIds(database, condition, transaction));
  return standing === null ? [...ids] : standingAs(reading, register, ids, standing);
}
