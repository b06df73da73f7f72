import type { Sequelize, Transaction } from 'sequelize';
import type { RegisterFilter } from '../../shared/schemas/register.ts';
import {
  isStandingColumn,
  STANDING_COLUMN_NAMES,
  type StandingColumn,
} from '../../shared/schemas/standing-columns.ts';
import {
  findAssignedGroups,
  findRunIds,
  findStandingGroups,
} from '../models/find-standing-groups.ts';
import type { RegisterOf } from '../models/register-condition.ts';
import { valuesById } from './values-by-id.ts';

/** What a filter asks of standings; null is for what stands nowhere. */
export type StandingFilter = Readonly<Partial<Record<StandingColumn, readonly (string | null)[]>>>;

/** The value of a column of standings of a building. */
export type ValueOf = (buildingId: number) => string | null;

/** With what standings are read: in a transaction where something hangs on it. */
export type Reading = {
  readonly database: Sequelize;
  readonly transaction: Transaction | null;
  /** The buildings of a run, where they are kept. */
  readonly runIds?: (runId: string | null) => Promise<Buffer>;
};

/** A filter in two: what the database is asked, and what is asked of standings; null where nothing is. */
export function splitFilter(filter: RegisterFilter): {
  readonly rest: RegisterFilter;
  readonly standing: StandingFilter | null;
} {
  const { any = {}, unknown = [], ...others } = filter;
  const wanted = STANDING_COLUMN_NAMES.flatMap((column) => {
    const values = [...(any[column] ?? []), ...(unknown.includes(column) ? [null] : [])];
    return values.length === 0 ? [] : [[column, values] as const];
  });
  if (wanted.length === 0) return { rest: filter, standing: null };
  const own = Object.entries(any).filter(([field]) => !isStandingColumn(field));
  const known = unknown.filter((field) => !isStandingColumn(field));
  const rest = {
    ...others,
    ...(own.length > 0 && { any: Object.fromEntries(own) }),
    ...(known.length > 0 && { unknown: known }),
  };
  return { rest, standing: Object.fromEntries(wanted) };
}

async function stateOf(
  { database, transaction, runIds }: Reading,
  register: RegisterOf,
): Promise<ValueOf> {
  const { runId } = register;
  const [groups, run] = await Promise.all([
    findStandingGroups(database, register, 'state', transaction),
    runIds === undefined ? findRunIds(database, runId, transaction) : runIds(runId),
  ]);
  const states = valuesById(groups);
  const inRun = valuesById([{ value: true, ids: run }]);
  return (id) => (inRun(id) === true ? (states(id) ?? 'to decide') : null);
}

/** Where buildings stand for the option that is shown, in one column. */
export async function standingOf(
  reading: Reading,
  register: RegisterOf,
  column: StandingColumn,
): Promise<ValueOf> {
  if (column === 'state') return stateOf(reading, register);
  const { database, transaction } = reading;
  const groups =
    column === 'decision'
      ? await findStandingGroups(database, register, 'kind', transaction)
      : await findAssignedGroups(database, register, transaction);
  const values = valuesById(groups);
  return (id) => values(id) ?? null;
}

/** Those of some buildings, in their order, that stand where a filter asks. */
export async function standingAs(
  reading: Reading,
  register: RegisterOf,
  ids: Iterable<number>,
  filter: StandingFilter,
): Promise<number[]> {
  let found = [...ids];
  for (const column of STANDING_COLUMN_NAMES) {
    const wanted = filter[column];
    if (wanted === undefined) continue;
    const valueOf = await standingOf(reading, register, column);
    const asked = new Set(wanted);
    found = found.filter((id) => asked.has(valueOf(id)));
  }
  return found;
}

/** Some buildings in order by where they stand, those alike as they came; what stands nowhere comes last. */
export async function inOrderOfStanding(
  reading: Reading,
  register: RegisterOf,
  ids: readonly number[],
  { column, descending }: { readonly column: StandingColumn; readonly descending: boolean },
): Promise<number[]> {
  const valueOf = await standingOf(reading, register, column);
  const groups = new Map<string | null, number[]>();
  for (const id of ids) {
    const value = valueOf(id);
    const alike = groups.get(value);
    if (alike === undefined) groups.set(value, [id]);
    else alike.push(id);
  }
  const values = [...groups.keys()]
    .flatMap((value) => value ?? [])
    .sort((a, b) => a.localeCompare(b));
  if (descending) values.reverse();
  return [...values, null].flatMap((value) => groups.get(value) ?? []);
}
