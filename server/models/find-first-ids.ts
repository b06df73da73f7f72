import { QueryTypes, type Sequelize } from 'sequelize';
import type { RegisterSort } from '../../shared/schemas/register.ts';
import { collationSql, orderSql } from './find-register-order.ts';
import { registerColumn } from './register-columns.ts';
import type { Condition } from './register-condition.ts';

type Value = string | number;

/** The value of a column that stands at a place of its order; undefined where fewer are known. */
async function valueAt(
  database: Sequelize,
  { from, where, bind }: Condition,
  { column, descending }: RegisterSort,
  place: number,
): Promise<Value | undefined> {
  const { name } = registerColumn(column);
  const direction = descending ? 'desc' : 'asc';
  const [found] = await database.query<{ value: Value }>(
    `select ${name} as value from ${from} where ${where} and ${name} is not null
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
function nearSql(
  { from, where }: Condition,
  sort: RegisterSort,
  last: string | undefined,
  most: number,
) {
  const { name } = registerColumn(sort.column);
  const collation = collationSql(sort.column);
  const isBefore =
    last === undefined
      ? `${name} is not null`
      : `${name}${collation} ${sort.descending ? '>' : '<'} ${last}`;
  const isAtEnd = last === undefined ? `${name} is null` : `${name}${collation} = ${last}`;
  return `(select * from ${from} where ${where} and ${isBefore})
    union all
    (select * from ${from} where ${where} and ${isAtEnd}
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
  sort: RegisterSort,
  { offset, limit }: { readonly offset: number; readonly limit: number },
): Promise<number[]> {
  const { from, where, bind } = condition;
  const most = offset + limit;
  const page = `order by ${orderSql(sort)} offset ${offset} limit ${limit}`;
  if (sort.column === 'reference') {
    return ids(database, `select id from ${from} where ${where} ${page}`, bind);
  }
  const value = await valueAt(database, condition, sort, most - 1);
  const { type } = registerColumn(sort.column);
  const last = value === undefined ? undefined : `$${bind.length + 1}::${type}`;
  return ids(
    database,
    `select id from (${nearSql(condition, sort, last, most)}) as near ${page}`,
    value === undefined ? bind : [...bind, value],
  );
}
