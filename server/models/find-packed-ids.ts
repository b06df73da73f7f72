import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** The numbers that a query gives as `id`, in its order, four bytes each. */
export async function findPackedIds(
  database: Sequelize,
  query: string,
  bind: readonly unknown[],
  transaction: Transaction | null = null,
): Promise<Buffer> {
  const [row] = await database.query<{ ids: Buffer | null }>(
    `select string_agg(int4send(id), '') as ids from (${query}) as ordered`,
    { type: QueryTypes.SELECT, bind: [...bind], transaction },
  );
  return row?.ids ?? Buffer.alloc(0);
}
