import type { StandingColumn } from '../../shared/schemas/standing-columns.ts';
import type { Services } from '../services.ts';
import type { Register } from './register-of.ts';
import { registerIds } from './register-order.ts';
import { standingOf } from './standings.ts';

/** Which values a column of standings has in a register, the commonest first. */
export async function standingChoices(
  services: Pick<Services, 'database' | 'tiles'>,
  register: Register,
  column: StandingColumn,
): Promise<{ value: string | null; count: number }[]> {
  const { database } = services;
  const [ids, valueOf] = await Promise.all([
    registerIds(services, register, {}),
    standingOf({ database, transaction: null }, register, column),
  ]);
  const counts = new Map<string | null, number>();
  for (const id of ids) {
    const value = valueOf(id);
    counts.set(value, (counts.get(value) ?? 0) + 1);
  }
  return [...counts].map(([value, count]) => ({ value, count })).sort((a, b) => b.count - a.count);
}
