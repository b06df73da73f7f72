import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** Writes the contours of a run, which come as text; a second time they are there already. */
export async function insertContours(
  database: Sequelize,
  runId: string,
  contours: string,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into run_contours (run_id, contours) values ($1, $2::jsonb) on conflict do nothing`,
    { bind: [runId, contours], transaction },
  );
}

/** Whether a run has its contours. */
export async function hasContours(
  database: Sequelize,
  runId: string,
  transaction: Transaction,
): Promise<boolean> {
  const found = await database.query('select 1 from run_contours where run_id = $1', {
    type: QueryTypes.SELECT,
    bind: [runId],
    transaction,
  });
  return found.length > 0;
}

/** The contours of a run, as the text of a list. */
export async function findContours(database: Sequelize, runId: string): Promise<string> {
  const [row] = await database.query<{ contours: string }>(
    'select contours::text as contours from run_contours where run_id = $1',
    { type: QueryTypes.SELECT, bind: [runId] },
  );
  return row?.contours ?? '[]';
}
