import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { RegisterColumn, RegisterSort } from '../../shared/schemas/register.ts';
import { findPackedIds } from './find-packed-ids.ts';
import { packIds } from '../register/packed-ids.ts';
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

const NONE = Buffer.alloc(0);

/** How many come one after the other with the same figure, eight bytes a figure. */
function sizesOf(values: Buffer): number[] {
  const sizes: number[] = [];
  let last = NaN;
  for (let k = 0; k < values.byteLength; k += 8) {
    const value = values.readDoubleBE(k);
    if (value === last) sizes[sizes.length - 1] = (sizes.at(-1) ?? 0) + 1;
    else sizes.push(1);
    last = value;
  }
  return sizes;
}

/** Figures hardly ever agree: putting them in order takes half of what finding those that do would. */
async function findFigureGroups(
  database: Sequelize,
  { from, where, bind }: Condition,
  name: string,
): Promise<RegisterGroups> {
  const [row] = await database.query<{ ids: Buffer | null; values: Buffer | null; all: number }>(
    `select string_agg(int4send(id), '') as ids,
       string_agg(float8send(value), '') filter (where value is not null) as values,
       count(*)::integer as all
     from (
       select id, ${name}::double precision as value from ${from} where ${where}
       order by value nulls last
     ) as ordered`,
    { type: QueryTypes.SELECT, bind: [...bind] },
  );
  const sizes = sizesOf(row?.values ?? NONE);
  const unknown = (row?.all ?? 0) - sizes.reduce((sum, size) => sum + size, 0);
  const all = unknown === 0 ? sizes : [...sizes, unknown];
  return { ids: row?.ids ?? NONE, sizes: packIds(Int32Array.from(all)), unknown };
}

/** Texts are often alike: nothing but values is compared, for text by text would take several times as long. */
async function findTextGroups(
  database: Sequelize,
  { from, where, bind }: Condition,
  value: string,
): Promise<RegisterGroups> {
  const [row] = await database.query<{ ids: Buffer | null; sizes: Buffer | null; unknown: number }>(
    `select string_agg(ids, '') as ids, string_agg(int4send(size), '') as sizes,
       coalesce(sum(size) filter (where value is null), 0)::integer as unknown
     from (
       select value, count(*)::integer as size, string_agg(int4send(id), '') as ids
       from (select id, ${value} as value from ${from} where ${where}) as meant
       group by value order by value nulls last
     ) as grouped`,
    { type: QueryTypes.SELECT, bind: [...bind] },
  );
  return { ids: row?.ids ?? NONE, sizes: row?.sizes ?? NONE, unknown: row?.unknown ?? 0 };
}

/** The buildings that are meant, by the value of a column ascending, those alike in groups. */
export function findRegisterGroups(
  database: Sequelize,
  condition: Condition,
  column: RegisterColumn,
): Promise<RegisterGroups> {
  const { name, type } = registerColumn(column);
  return type === 'double precision'
    ? findFigureGroups(database, condition, name)
    : findTextGroups(database, condition, `${name}${collationSql(column)}`);
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
