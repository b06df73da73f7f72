import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { findPackedIds } from './find-packed-ids.ts';
import { ownColumn, type OwnColumn, type OwnSort } from './register-columns.ts';
import type { Condition } from './register-condition.ts';

/** The collation of a column, as its index has it. */
export function collationSql(column: OwnColumn): string {
  return ownColumn(column).type === 'text' ? ' collate natural_order' : '';
}

/** The order of a register in SQL: unknown last, then by reference, as people count. */
export function orderSql({ column, descending }: OwnSort): string {
  const { name } = ownColumn(column);
  const collation = collationSql(column);
  const direction = descending ? 'desc' : 'asc';
  if (column === 'reference') return `reference${collation} ${direction}, id ${direction}`;
  return `${name}${collation} ${direction} nulls last, reference collate natural_order, id`;
}

/** The numbers of all buildings that are meant, by reference, four bytes each. */
export function findReferenceOrder(
  database: Sequelize,
  { where, bind }: Condition,
): Promise<Buffer> {
  const order = orderSql({ column: 'reference', descending: false });
  return findPackedIds(database, `select id from buildings where ${where} order by ${order}`, bind);
}

/** The buildings of which a column is known, ascending by it, four bytes a number. */
export type OwnOrder = { readonly ids: Buffer } & (
  | { readonly figures: Buffer; readonly sizes: null }
  | { readonly figures: null; readonly sizes: Buffer }
);

/** Figures hardly ever agree: putting them in order takes half of what finding those that do would. */
function figuresSql(where: string, name: string): string {
  return `select string_agg(int4send(id), '') as ids,
      string_agg(float8send(value), '') as figures, null as sizes
    from (
      select id, ${name}::double precision as value
      from buildings where ${where} and ${name} is not null order by value
    ) as ordered`;
}

/** Texts are often alike: nothing but values is compared, for text by text would take several times as long. */
function textsSql(where: string, value: string): string {
  return `select string_agg(ids, '') as ids, null as figures,
      string_agg(int4send(size), '') as sizes
    from (
      select value, count(*)::integer as size, string_agg(int4send(id), '') as ids
      from (select id, ${value} as value from buildings where ${where}) as meant
      where value is not null group by value order by value
    ) as grouped`;
}

/** The buildings that are meant by one of their own columns: with a figure each, or how many are alike. */
export async function findOwnOrder(
  database: Sequelize,
  { where, bind }: Condition,
  column: OwnColumn,
): Promise<OwnOrder | undefined> {
  const { name, type } = ownColumn(column);
  const query =
    type === 'text' ? textsSql(where, `${name}${collationSql(column)}`) : figuresSql(where, name);
  const [found] = await database.query<OwnOrder | { ids: null }>(query, {
    type: QueryTypes.SELECT,
    bind: [...bind],
  });
  return found?.ids ? found : undefined;
}

/** The numbers of all buildings that are meant in no order, which takes as long again; four bytes each. */
export function findRegisterIds(
  database: Sequelize,
  { where, bind }: Condition,
  transaction: Transaction | null,
): Promise<Buffer> {
  return findPackedIds(database, `select id from buildings where ${where}`, bind, transaction);
}
