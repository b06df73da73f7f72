import { QueryTypes, type Sequelize } from 'sequelize';
import type { RegisterSort } from '../../shared/schemas/register.ts';
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

/**
 * All of it in order. Texts are compared by the rules of languages, which is slow: references come
 * ordered from their index, and of other texts each is compared once, however often it is there.
 */
function orderedIds(sort: RegisterSort, where: string): string {
  if (sort.column === 'reference') {
    return `select id from buildings where ${where} order by ${orderSql(sort)}`;
  }
  const { name, type } = registerColumn(sort.column);
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
