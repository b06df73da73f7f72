import {
  REGISTER_ORDER,
  type RegisterColumn,
  type RegisterFilter,
} from '../../shared/schemas/register.ts';
import { isResultColumn } from '../../shared/schemas/result-columns.ts';
import { isBesideColumn, isStandingColumn } from '../../shared/schemas/standing-columns.ts';
import {
  findOwnOrder,
  findReferenceOrder,
  findRegisterIds,
} from '../models/find-register-order.ts';
import { countRows } from '../models/find-register-rows.ts';
import { registerCondition } from '../models/register-condition.ts';
import type { Services } from '../services.ts';
import { packIds, packedIds, unpackIds, type PackedIds } from './packed-ids.ts';
import { placesById } from './places-by-id.ts';
import { inOrderOf, rankedFigures, rankedGroups, rankedSizes, type Ranked } from './ranked.ts';
import type { Register } from './register-of.ts';
import { columnsBeside, splitFilter, type Which } from './split-filter.ts';
import { meantBeside, readingOf, valuesBeside } from './values-beside.ts';

/** The whole register as it is read first. */
const WHOLE: Which = { filter: {}, sort: REGISTER_ORDER };

function keyOf(what: string, register: Register, which: Which): string {
  const { schemeId, version, runId, decisionsVersion } = register;
  const columns = columnsBeside(which);
  const beside = `${columns.length > 0 ? runId : null}/${columns.some(isStandingColumn) ? decisionsVersion : null}`;
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

/** By reference, as the whole register stands, which is put in order once for all. */
async function byReference(
  services: Kept,
  register: Register,
  filter: RegisterFilter,
): Promise<Buffer> {
  const { database } = services;
  const condition = registerCondition(register, filter);
  if (Object.keys(filter).length === 0) return findReferenceOrder(database, condition);
  const [ids, whole] = await Promise.all([
    findRegisterIds(database, condition, null),
    packedOrder(services, register, WHOLE),
  ]);
  const placeOf = placesById(unpackIds(ids));
  return packIds(unpackIds(whole).filter((id) => placeOf(id) !== -1));
}

async function rankedColumn(
  services: Kept,
  register: Register,
  filter: RegisterFilter,
  column: RegisterColumn,
): Promise<Ranked> {
  if (isBesideColumn(column)) {
    return valuesBeside(readingOf(services), register, column);
  }
  const found = await findOwnOrder(services.database, registerCondition(register, filter), column);
  if (found === undefined) return rankedGroups([]);
  const { ids, figures, sizes } = found;
  return figures === null ? rankedSizes(ids, sizes) : rankedFigures(ids, figures);
}

/** By one column, then by reference. */
async function byColumn(
  services: Kept,
  register: Register,
  { filter, sort: { column, descending } }: Which,
): Promise<Buffer> {
  const [alike, ranked] = await Promise.all([
    packedOrder(services, register, { filter, sort: REGISTER_ORDER }),
    column === 'reference' ? null : rankedColumn(services, register, filter, column),
  ]);
  const ids = unpackIds(alike);
  return packIds(ranked === null ? ids.reverse() : inOrderOf(ranked, ids, descending));
}

/**
 * What stands beside buildings is looked up in memory and laid over an order that is kept: where they stand,
 * which every decision changes, over what the run found, and that over what they have themselves.
 */
async function makeOrder(services: Kept, register: Register, which: Which): Promise<Buffer> {
  const { filter, sort } = which;
  if (isStandingColumn(sort.column)) return byColumn(services, register, which);
  const isLaidOver = columnsBeside(which).some(isStandingColumn)
    ? isStandingColumn
    : isResultColumn;
  const { rest, asked } = splitFilter(filter, isLaidOver);
  if (asked.length > 0) {
    const [under, isMeant] = await Promise.all([
      packedOrder(services, register, { filter: rest, sort }),
      meantBeside(readingOf(services), register, asked),
    ]);
    return packIds(unpackIds(under).filter(isMeant));
  }
  const isByReference = sort.column === 'reference' && !sort.descending;
  return isByReference
    ? byReference(services, register, filter)
    : byColumn(services, register, which);
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
  services: Kept,
  register: Register,
  filter: RegisterFilter,
): Promise<Int32Array> {
  return unpackIds(await packedOrder(services, register, { ...WHOLE, filter })).sort();
}

/** How many buildings a filter of the register alone means, kept as their order is. */
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
