import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { RegisterColumn, RegisterSort } from '../../shared/schemas/register.ts';
import { findPackedIds } from './find-packed-ids.ts';
import { registerColumn } from './register-columns.ts';
import type { Condition } from './register-condition.ts';

/** The collation of a column, as its index has it. */
export function collationSql(column: RegisterColumn): string {
  return registerColumn(column).type === 'text' ? ' collate natural_order' : '';
}

/** The order of a register in SQL: unknown last, then by reference, as people count. */
export function orderSql({ column, descending }: RegisterSort): string {
  const { name } = registerColumn(column);
  const collation = collationSql(column);
  const direction = descending ? 'desc' : 'asc';
  if (column === 'reference') return `reference${collation} ${direction}, id ${direction}`;
  return `${name}${collation} ${direction} nulls last, reference collate natural_order, id`;
}

/** The numbers of all buildings that are meant, by reference, four bytes each. */
export function findReferenceOrder(
  database: Sequelize,
  { from, where, bind }: Condition,
  descending: boolean,
): Promise<Buffer> {
  const order = orderSql({ column: 'reference', descending });
  return findPackedIds(database, `select id from ${from} where ${where} order by ${order}`, bind);
}

/** Buildings that are alike in a column, group after group. */
export type RegisterGroups = {
  /** Their numbers in no order within a group, four bytes each. */
  readonly ids: Buffer;
  /** How many each group has, four bytes each. */
  readonly sizes: Buffer;
  /** How many are in the last group, whose value is not known. */
  readonly unknown: number;
};

/**
 * The buildings that are meant, by the value of a column ascending. Nothing but values is compared here:
 * putting what is alike in order, text by text, would take several times as long.
 */
export async function findRegisterGroups(
  database: Sequelize,
  { from, where, bind }: Condition,
  column: RegisterColumn,
): Promise<RegisterGroups> {
  const { name } = registerColumn(column);
  const [row] = await database.query<{ ids: Buffer | null; sizes: Buffer | null; unknown: number }>(
    `select string_agg(ids, '') as ids, string_agg(int4send(size), '') as sizes,
       coalesce(sum(size) filter (where value is null), 0)::integer as unknown
     from (
       select value, count(*)::integer as size, string_agg(int4send(id), '') as ids
       from (select id, ${name}${collationSql(column)} as value from ${from} where ${where}) as meant
       group by value order by value nulls last
     ) as grouped`,
    { type: QueryTypes.SELECT, bind: [...bind] },
  );
  const none = Buffer.alloc(0);
  return { ids: row?.ids ?? none, sizes: row?.sizes ?? none, unknown: row?.unknown ?? 0 };
}

/** The numbers of all buildings that are meant, ascending, four bytes each. */
export function findRegisterIds(
  database: Sequelize,
  { from, where, bind }: Condition,
  transaction: Transaction | null,
): Promise<Buffer> {
  const query = `select id from ${from} where ${where} order by id`;
  return findPackedIds(database, query, bind, transaction);
}
