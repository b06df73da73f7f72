import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { RESULT_COLUMN_NAMES, type ResultColumn } from '../../shared/schemas/result-columns.ts';
import { isResultFigure } from '../../shared/schemas/result-values.ts';
import { resultSql } from './columns-beside.ts';

function found(column: ResultColumn): string {
  return `(select r.building_id as id, ${resultSql(column)} as value
    from run_results r where r.run_id = $1) as found where value is not null`;
}

function orderSql(column: ResultColumn): string {
  if (isResultFigure(column)) {
    return `insert into run_orders (run_id, result_column, place, ids, figures)
      select $1, '${column}', 0, string_agg(int4send(id), ''), string_agg(float8send(value), '')
      from (select * from ${found(column)} order by value) as ordered having count(*) > 0`;
  }
  return `insert into run_orders (run_id, result_column, place, ids, words)
    select $1, '${column}', row_number() over (order by value collate natural_order) - 1, ids, value
    from (
      select value, string_agg(int4send(id), '') as ids from ${found(column)} group by value
    ) as alike`;
}

/**
 * Puts what a run found in order once and for all, column by column in the units of the register, so that
 * nobody has to who asks for it.
 */
export async function insertRunOrders(
  database: Sequelize,
  runId: string,
  transaction: Transaction,
): Promise<void> {
  for (const column of RESULT_COLUMN_NAMES) {
    await database.query(orderSql(column), { bind: [runId], transaction });
  }
}

/** Buildings, four bytes a number, with a figure each, eight bytes, or words that they share. */
export type OrderedPart = { readonly ids: Buffer } & (
  | { readonly figures: Buffer; readonly words: null }
  | { readonly figures: null; readonly words: string }
);

/** What a complete run found in one column, ascending; a building that has nothing there is not in it. */
export function findRunOrders(
  database: Sequelize,
  runId: string | null,
  column: ResultColumn,
  transaction: Transaction | null,
): Promise<OrderedPart[]> {
  return database.query<OrderedPart>(
    `select ids, figures, words from run_orders
     where run_id = $1::uuid and result_column = $2 order by place`,
    { type: QueryTypes.SELECT, bind: [runId, column], transaction },
  );
}
