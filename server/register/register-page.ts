import type { z } from 'zod';
import type { registerQuerySchema } from '../../shared/schemas/register.ts';
import { findFirstRows } from '../models/find-first-rows.ts';
import { findRows } from '../models/find-register-rows.ts';
import { registerCondition } from '../models/register-condition.ts';
import type { Scheme } from '../models/scheme.ts';
import type { ListedBuilding } from '../presenters/building-values.ts';
import type { Services } from '../services.ts';
import { isOrdered, registerCount, registerOrder } from './register-order.ts';

/** So far the database looks by itself; further down all of it is put in order once and kept. */
const NEAR = 400;

/** A page of a register with how many there are by the filter and in all. */
export async function registerPage(
  services: Pick<Services, 'database' | 'tiles'>,
  scheme: Scheme,
  query: z.infer<typeof registerQuerySchema>,
): Promise<{ rows: ListedBuilding[]; found: number; all: number }> {
  const { database } = services;
  const { filter, sort, offset, limit } = query;
  const which = { filter, sort };
  if (offset + limit > NEAR || isOrdered(services, scheme, which)) {
    const order = await registerOrder(services, scheme, which);
    const [rows, all] = await Promise.all([
      findRows(database, order.slice(offset, offset + limit)),
      registerCount(services, scheme, {}),
    ]);
    return { rows, found: order.count, all };
  }
  const [rows, found, all] = await Promise.all([
    findFirstRows(database, registerCondition(scheme.id, filter), sort, { offset, limit }),
    registerCount(services, scheme, filter),
    registerCount(services, scheme, {}),
  ]);
  return { rows, found, all };
}
