import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** What was removed, and the hashes of photographs that nothing names any more. */
export type RemovedLetters = {
  readonly letters: number;
  readonly matters: number;
  readonly photographs: readonly string[];
};

/**
 * Removes what is kept of a scheme's erased parties beyond its day. The database looks for itself whose day
 * has passed: the tables are closed to the serving role.
 */
export async function removeKeptLetters(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction,
): Promise<RemovedLetters> {
  const [removed] = await database.query<RemovedLetters>(
    'select letters, matters, photographs from remove_kept_letters($1)',
    { type: QueryTypes.SELECT, bind: [schemeId], transaction },
  );
  return removed ?? { letters: 0, matters: 0, photographs: [] };
}
