import { QueryTypes, type Sequelize } from 'sequelize';
import type { RegisterColumn, RegisterSort } from '../../shared/schemas/register.ts';
import { registerColumn } from './register-columns.ts';
import type { Condition } from './register-condition.ts';

/** The order of a register in SQL: unknown last, then by reference, as people count. */
export function orderSql({ column, descending }: RegisterSort): string {
  const { name, type } = registerColumn(column);
  const collation = type === 'text' ? ' collate natural_order' : '';
  const direction = descending ? 'desc' : 'asc';
  if (column === 'reference') return `reference${collation} ${direction}, id ${direction}`;
  return `${name}${collation} ${direction} nulls last, reference collate natural_order, id`;
}

/** Columns of which nearly every value differs; an index keeps them in order. */
const KEPT_IN_ORDER: ReadonlySet<RegisterColumn> = new Set(['reference', 'name', 'address']);

/** The other way round by an index that runs forwards: whole values are turned, not what is alike. */
function turnedIds(name: string, where: string): string {
  return `select id from (
      select id, ${name} is null as is_unknown,
        dense_rank() over (order by ${name} collate natural_order) as rank,
        row_number() over (order by ${name} collate natural_order, reference collate natural_order, id) as place
      from buildings where ${where}
    ) as placed order by is_unknown, rank desc, place`;
}

/**
 * All of it in order. Texts are compared by the rules of languages, which is slow: those that
 * differ come ordered from their index, and of others each is compared once, however often it is there.
 */
function orderedIds(sort: RegisterSort, where: string): string {
  const { name, type } = registerColumn(sort.column);
  if (KEPT_IN_ORDER.has(sort.column)) {
    const isTurned = sort.descending && sort.column !== 'reference';
    return isTurned
      ? turnedIds(name, where)
      : `select id from buildings where ${where} order by ${orderSql(sort)}`;
  }
  const direction = `${sort.descending ? 'desc' : 'asc'} nulls last`;
  const places = `select id, ${name} as value,
    row_number() over (order by reference collate natural_order, id) as place
    from buildings where ${where}`;
  if (type !== 'text')
    return `select id from (${places}) as placed order by value ${direction}, place`;
  const ranks = `select value, row_number() over (order by value collate natural_order, value) as rank
    from (select distinct ${name} as value from buildings where ${where}) as given
    where value is not null`;
  return `select id from (${places}) as placed left join (${ranks}) as ranked using (value)
    order by rank ${direction}, place`;
}

async function packed(
  database: Sequelize,
  query: string,
  bind: Condition['bind'],
): Promise<Buffer> {
  const [row] = await database.query<{ ids: Buffer | null }>(
    `select string_agg(int4send(id), '') as ids from (${query}) as ordered`,
    { type: QueryTypes.SELECT, bind: [...bind] },
  );
  return row?.ids ?? Buffer.alloc(0);
}

/** The numbers of all buildings that are meant, in order, four bytes each. */
export function findRegisterOrder(
  database: Sequelize,
  { where, bind }: Condition,
  sort: RegisterSort,
): Promise<Buffer> {
  return packed(database, orderedIds(sort, where), bind);
}

/** The numbers of all buildings that are meant, ascending, four bytes each. */
export function findRegisterIds(database: Sequelize, { where, bind }: Condition): Promise<Buffer> {
  return packed(database, `select id from buildings where ${where} order by id`, bind);
}
