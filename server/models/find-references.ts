import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** The references of a scheme that begin in some way. */
export async function findReferences(
  database: Sequelize,
  schemeId: string,
  beginning: string,
  transaction: Transaction,
): Promise<ReadonlySet<string>> {
  const rows = await database.query<{ reference: string }>(
    `select reference from buildings
     where scheme_id = $1 and removed_at is null and starts_with(reference, $2)`,
    { type: QueryTypes.SELECT, bind: [schemeId, beginning], transaction },
  );
  return new Set(rows.map(({ reference }) => reference));
}
