import type { BesideColumn } from '../../shared/schemas/standing-columns.ts';
import type { Services } from '../services.ts';
import { countsOf } from './ranked.ts';
import type { Register } from './register-of.ts';
import { registerIds } from './register-order.ts';
import { readingOf, valuesBeside } from './values-beside.ts';

const MOST = 50;

/** Which values a column beside buildings has in a register, the commonest first. */
export async function besideChoices(
  services: Pick<Services, 'database' | 'tiles'>,
  register: Register,
  column: BesideColumn,
): Promise<{ value: string | null; count: number }[]> {
  const [ids, ranked] = await Promise.all([
    registerIds(services, register, {}),
    valuesBeside(readingOf(services), register, column),
  ]);
  return countsOf(ranked, ids)
    .map(({ value, count }) => ({ value: value === null ? null : String(value), count }))
    .sort((a, b) => b.count - a.count)
    .slice(0, MOST);
}
