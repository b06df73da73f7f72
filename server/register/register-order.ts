import {
  REGISTER_ORDER,
  type RegisterFilter,
  type RegisterSort,
} from '../../shared/schemas/register.ts';
import { isResultColumn } from '../../shared/schemas/result-columns.ts';
import { isStandingColumn } from '../../shared/schemas/standing-columns.ts';
import {
  findReferenceOrder,
  findRegisterGroups,
  findRegisterIds,
} from '../models/find-register-order.ts';
import { findRunIds } from '../models/find-standing-groups.ts';
import { countRows } from '../models/find-register-rows.ts';
import {
  asksResults,
  registerCondition,
  resultsAlone,
  type Condition,
} from '../models/register-condition.ts';
import type { Services } from '../services.ts';
import { ofRegister, oneGroup } from './of-register.ts';
import { orderGroups } from './order-groups.ts';
import { meantIds } from './meant-ids.ts';
import { packIds, packedIds, unpackIds, type PackedIds } from './packed-ids.ts';
import type { Register } from './register-of.ts';
import { inOrderOfStanding, splitFilter, standingAs, type Reading } from './standings.ts';

type Which = { readonly filter: RegisterFilter; readonly sort: RegisterSort };

/** The whole register as it is read first. */
const WHOLE: Which = { filter: {}, sort: REGISTER_ORDER };

/** What buildings and their order hang on besides the register: what a run found, and where they stand. */
export function askedBeside({ filter, sort: { column } }: Which): {
  readonly results: boolean;
  readonly standings: boolean;
} {
  const { rest, standing } = splitFilter(filter);
  const standings = standing !== null || isStandingColumn(column);
  return { results: standings || asksResults(rest, column), standings };
}

function keyOf(what: string, register: Register, which: Which): string {
  const { schemeId, version, runId, decisionsVersion } = register;
  const { results, standings } = askedBeside(which);
  const beside = `${results ? runId : null}/${standings ? decisionsVersion : null}`;
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

/** Reads standings with what is kept: what a run has never changes. */
function readingOf({ database, tiles }: Kept): Reading {
  return {
    ...{ database, transaction: null },
    runIds: (runId) => tiles.get(`in run/${runId}`, () => findRunIds(database, runId, null)),
  };
}

/** Some buildings by reference, put in order by that of the whole register. */
async function byReference(
  services: Kept,
  register: Register,
  condition: Condition,
  descending: boolean,
): Promise<Buffer> {
  const [ids, references] = await Promise.all([
    findRegisterIds(services.database, condition, null),
    packedOrder(services, register, WHOLE),
  ]);
  const ordered = orderGroups(oneGroup(ids), references, false);
  return descending ? packIds(unpackIds(ordered).reverse()) : ordered;
}

/**
 * By one column, then by reference: the order by reference is that of the whole register, kept for all. What
 * a run found of all buildings is put in order without looking at these.
 */
async function makeOrder(
  services: Kept,
  register: Register,
  { filter, sort }: Which,
): Promise<Buffer> {
  const { database } = services;
  const { column, descending } = sort;
  const isWhole = Object.keys(filter).length === 0;
  const condition = registerCondition(register, filter, column);
  if (column === 'reference') {
    return isWhole
      ? findReferenceOrder(database, condition, descending)
      : byReference(services, register, condition, descending);
  }
  const isOfRun = isWhole && isResultColumn(column);
  const asked = isOfRun ? resultsAlone(register.runId) : condition;
  const [groups, references] = await Promise.all([
    findRegisterGroups(database, asked, column),
    packedOrder(services, register, WHOLE),
  ]);
  return orderGroups(isOfRun ? ofRegister(groups, references) : groups, references, descending);
}

function packedOrder(services: Kept, register: Register, which: Which): Promise<Buffer> {
  const { rest, standing } = splitFilter(which.filter);
  const { column, descending } = which.sort;
  return services.tiles.get(keyOf('order', register, which), async () => {
    const order = isStandingColumn(column) ? { column, descending } : null;
    if (standing === null && order === null) return makeOrder(services, register, which);
    const sort = order === null ? which.sort : REGISTER_ORDER;
    const all = await packedOrder(services, register, { filter: rest, sort });
    const reading = readingOf(services);
    const found = await standingAs(reading, register, unpackIds(all), standing ?? {});
    const ordered =
      order === null ? found : await inOrderOfStanding(reading, register, found, order);
    return packIds(Int32Array.from(ordered));
  });
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
): Promise<number[]> {
  return meantIds(readingOf(services), register, filter);
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
