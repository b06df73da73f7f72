import type { z } from 'zod';
import type { registerQuerySchema } from '../../shared/schemas/register.ts';
import { isBesideColumn } from '../../shared/schemas/standing-columns.ts';
import { findFirstIds } from '../models/find-first-ids.ts';
import { findRows } from '../models/find-register-rows.ts';
import { registerCondition } from '../models/register-condition.ts';
import type { ListedBuilding } from '../presenters/building-values.ts';
import type { Services } from '../services.ts';
import type { Register } from './register-of.ts';
import { isOrdered, registerCount, registerOrder } from './register-order.ts';
import { columnsBeside } from './split-filter.ts';

/** So far the database looks by itself; further down all of it is put in order once and kept. */
const NEAR = 400;

/** A page of a register with how many there are by the filter and in all. */
export async function registerPage(
  services: Pick<Services, 'database' | 'tiles'>,
  register: Register,
  query: z.infer<typeof registerQuerySchema>,
): Promise<{ rows: ListedBuilding[]; found: number; all: number }> {
  const { database } = services;
  const { filter, sort, offset, limit } = query;
  const { column, descending } = sort;
  const which = { filter, sort };
  // what stands beside is looked up in memory, so all of it is put in order there
  const isBeside = isBesideColumn(column) || columnsBeside(which).length > 0;
  if (isBeside || offset + limit > NEAR || isOrdered(services, register, which)) {
    const order = await registerOrder(services, register, which);
    const [rows, all] = await Promise.all([
      findRows(database, register, order.slice(offset, offset + limit)),
      registerCount(services, register, {}),
    ]);
    return { rows, found: order.count, all };
  }
  const condition = registerCondition(register, filter);
  const [rows, found, all] = await Promise.all([
    findFirstIds(database, condition, { column, descending }, { offset, limit }).then((ids) =>
      findRows(database, register, ids),
    ),
    registerCount(services, register, filter),
    registerCount(services, register, {}),
  ]);
  return { rows, found, all };
}
