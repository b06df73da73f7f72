import type { Sequelize, Transaction } from 'sequelize';
import { isResultColumn, type ResultColumn } from '../../shared/schemas/result-columns.ts';
import type { BesideColumn, StandingColumn } from '../../shared/schemas/standing-columns.ts';
import { findAssignedGroups, findStandingGroups } from '../models/find-standing-groups.ts';
import type { RegisterOf } from '../models/register-condition.ts';
import { findRunOrders } from '../models/run-orders.ts';
import type { Services } from '../services.ts';
import { unpackIds } from './packed-ids.ts';
import { placesById } from './places-by-id.ts';
import {
  meantBy,
  rankedFigures,
  rankedGroups,
  type AlikeIds,
  type RankedValues,
} from './ranked.ts';
import type { AskedBeside } from './split-filter.ts';

/** With what is read what stands beside buildings: in a transaction where something hangs on it. */
export type Reading = {
  readonly database: Sequelize;
  readonly transaction: Transaction | null;
  /** Keeps what never changes, where that is wanted. */
  readonly kept?: (key: string, make: () => Promise<Buffer>) => Promise<Buffer>;
};

/** Reads what is shown, with what is kept. */
export function readingOf({ database, tiles }: Pick<Services, 'database' | 'tiles'>): Reading {
  return { database, transaction: null, kept: (key, make) => tiles.get(key, make) };
}

async function foundOf(
  { database, transaction }: Reading,
  { runId }: RegisterOf,
  column: ResultColumn,
): Promise<RankedValues> {
  const parts = await findRunOrders(database, runId, column, transaction);
  const [first] = parts;
  if (first !== undefined && first.figures !== null) {
    return rankedFigures(first.ids, first.figures);
  }
  return rankedGroups(parts.map(({ words, ids }) => ({ value: words ?? '', ids })));
}

function ascending(groups: readonly AlikeIds[]): AlikeIds[] {
  return [...groups].sort((a, b) => a.value.localeCompare(b.value));
}

const TO_DECIDE = 'to decide';

/** The buildings of a run: of all that it has it says the stage. */
function runIds(
  { database, transaction, kept = (_key, make) => make() }: Reading,
  { runId }: RegisterOf,
): Promise<Buffer> {
  return kept(`in run/${runId}`, async () => {
    const [stages] = await findRunOrders(database, runId, 'stage', transaction);
    return stages?.ids ?? Buffer.alloc(0);
  });
}

/** Only what the run has stands anywhere. */
async function stateOf(reading: Reading, register: RegisterOf): Promise<RankedValues> {
  const { database, transaction } = reading;
  const [groups, run] = await Promise.all([
    findStandingGroups(database, register, 'state', transaction),
    runIds(reading, register),
  ]);
  const all = ascending([...groups, { value: TO_DECIDE, ids: Buffer.alloc(0) }]);
  const placeOf = placesById(unpackIds(run));
  const { rankOf, ...column } = rankedGroups(all);
  const toDecide = all.findIndex(({ value }) => value === TO_DECIDE);
  return {
    ...column,
    rankOf: (id) => {
      if (placeOf(id) === -1) return -1;
      const rank = rankOf(id);
      return rank === -1 ? toDecide : rank;
    },
  };
}

async function standingOf(
  reading: Reading,
  register: RegisterOf,
  column: StandingColumn,
): Promise<RankedValues> {
  if (column === 'state') return stateOf(reading, register);
  const { database, transaction } = reading;
  const groups =
    column === 'decision'
      ? await findStandingGroups(database, register, 'kind', transaction)
      : await findAssignedGroups(database, register, transaction);
  return rankedGroups(ascending(groups));
}

/** What stands beside buildings in one column: what the run found, or where they stand for its option. */
export function valuesBeside(
  reading: Reading,
  register: RegisterOf,
  column: BesideColumn,
): Promise<RankedValues> {
  return isResultColumn(column)
    ? foundOf(reading, register, column)
    : standingOf(reading, register, column);
}

/** Tells whether a building is meant by all that is asked beside it. */
export async function meantBeside(
  reading: Reading,
  register: RegisterOf,
  asked: readonly AskedBeside[],
): Promise<(buildingId: number) => boolean> {
  const tests = await Promise.all(
    asked.map(async ({ column, isMeant }) =>
      meantBy(await valuesBeside(reading, register, column), isMeant),
    ),
  );
  return (id) => tests.every((isMeant) => isMeant(id));
}
