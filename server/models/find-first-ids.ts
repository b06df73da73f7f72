import { QueryTypes, type Sequelize } from 'sequelize';
import { collationSql, orderSql } from './find-register-order.ts';
import { ownColumn, type OwnSort } from './register-columns.ts';
import type { Condition } from './register-condition.ts';

type Value = string | number;

/** The value of a column that stands at a place of its order; undefined where fewer are known. */
async function valueAt(
  database: Sequelize,
  { where, bind }: Condition,
  { column, descending }: OwnSort,
  place: number,
): Promise<Value | undefined> {
  const { name } = ownColumn(column);
  const direction = descending ? 'desc' : 'asc';
  const [found] = await database.query<{ value: Value }>(
    `select ${name} as value from buildings where ${where} and ${name} is not null
     order by ${name}${collationSql(column)} ${direction} offset ${place} limit 1`,
    { type: QueryTypes.SELECT, bind: [...bind] },
  );
  return found?.value;
}

/**
 * Few rows that the beginning of an order is among: all that come before the value at its end, and as
 * many as are wanted of those that have it. Only what is alike has to be ordered by reference, which the
 * index of references does.
 */
function nearSql({ where }: Condition, sort: OwnSort, last: string | undefined, most: number) {
  const { name } = ownColumn(sort.column);
  const collation = collationSql(sort.column);
  const isBefore =
    last === undefined
      ? `${name} is not null`
      : `${name}${collation} ${sort.descending ? '>' : '<'} ${last}`;
  const isAtEnd = last === undefined ? `${name} is null` : `${name}${collation} = ${last}`;
  return `(select * from buildings where ${where} and ${isBefore})
    union all
    (select * from buildings where ${where} and ${isAtEnd}
     order by reference collate natural_order, id limit ${most})`;
}

async function ids(
  database: Sequelize,
  query: string,
  bind: readonly unknown[],
): Promise<number[]> {
  const rows = await database.query<{ id: number }>(query, {
    type: QueryTypes.SELECT,
    bind: [...bind],
  });
  return rows.map(({ id }) => id);
}

/** Numbers of buildings near the beginning of an order, found without putting all of it in order. */
export async function findFirstIds(
  database: Sequelize,
  condition: Condition,
  sort: OwnSort,
  { offset, limit }: { readonly offset: number; readonly limit: number },
): Promise<number[]> {
  const { where, bind } = condition;
  const most = offset + limit;
  const page = `order by ${orderSql(sort)} offset ${offset} limit ${limit}`;
  if (sort.column === 'reference') {
    return ids(database, `select id from buildings where ${where} ${page}`, bind);
  }
  const value = await valueAt(database, condition, sort, most - 1);
  const { type } = ownColumn(sort.column);
  const last = value === undefined ? undefined : `$${bind.length + 1}::${type}`;
  return ids(
    database,
    `select id from (${nearSql(condition, sort, last, most)}) as near ${page}`,
    value === undefined ? bind : [...bind, value],
  );
}
