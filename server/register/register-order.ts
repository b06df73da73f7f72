import {
  REGISTER_ORDER,
  type RegisterFilter,
  type RegisterSort,
} from '../../shared/schemas/register.ts';
import {
  findReferenceOrder,
  findRegisterGroups,
  findRegisterIds,
} from '../models/find-register-order.ts';
import { countRows } from '../models/find-register-rows.ts';
import { askedBeside, registerCondition } from '../models/register-condition.ts';
import type { Services } from '../services.ts';
import { orderGroups } from './order-groups.ts';
import { packedIds, type PackedIds } from './packed-ids.ts';
import type { Register } from './register-of.ts';

type Which = { readonly filter: RegisterFilter; readonly sort: RegisterSort };

function keyOf(what: string, register: Register, which: Which): string {
  const { schemeId, version, runId, decisionsVersion } = register;
  const asked = askedBeside(which.filter, which.sort.column);
  const beside = `${asked.results ? runId : null}/${asked.standings ? decisionsVersion : null}`;
  return `${what}/${schemeId}/${version}/${beside}/${JSON.stringify(which)}`;
}

/** Whether the buildings that a filter means have been put in order already. */
export function isOrdered(
  { tiles }: Pick<Services, 'tiles'>,
  register: Register,
  which: Which,
): boolean {
  return tiles.has(keyOf('order', register, which));
}

const BYTES = 4;

type Kept = Pick<Services, 'database' | 'tiles'>;

/** By one column, then by reference: the order by reference is that of the whole register, kept for all. */
async function makeOrder(
  services: Kept,
  register: Register,
  { filter, sort }: Which,
): Promise<Buffer> {
  const { database } = services;
  const { column, descending } = sort;
  const condition = registerCondition(register, filter, column);
  if (column === 'reference') return findReferenceOrder(database, condition, descending);
  const [groups, references] = await Promise.all([
    findRegisterGroups(database, condition, column),
    packedOrder(services, register, { filter: {}, sort: REGISTER_ORDER }),
  ]);
  return orderGroups(groups, references, descending);
}

function packedOrder(services: Kept, register: Register, which: Which): Promise<Buffer> {
  return services.tiles.get(keyOf('order', register, which), () =>
    makeOrder(services, register, which),
  );
}

/**
 * The buildings that a filter means, in order. Kept as long as tiles are: a register that changed has
 * another version and so another key.
 */
export async function registerOrder(
  services: Kept,
  register: Register,
  which: Which,
): Promise<PackedIds> {
  return packedIds(await packedOrder(services, register, which));
}

/** The numbers of the buildings that a filter means, ascending. */
export async function registerIds(
  { database }: Pick<Services, 'database'>,
  register: Register,
  filter: RegisterFilter,
): Promise<number[]> {
  const condition = registerCondition(register, filter);
  const ids = packedIds(await findRegisterIds(database, condition));
  return ids.slice(0, ids.count);
}

/** How many buildings a filter means, kept as their order is. */
export async function registerCount(
  { database, tiles }: Pick<Services, 'database' | 'tiles'>,
  register: Register,
  filter: RegisterFilter,
): Promise<number> {
  const key = keyOf('count', register, { filter, sort: REGISTER_ORDER });
  const count = await tiles.get(key, async () => {
    const bytes = Buffer.alloc(BYTES);
    bytes.writeInt32BE(await countRows(database, registerCondition(register, filter)));
    return bytes;
  });
  return count.readInt32BE();
}
