import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** The run that the register and the plan of a scheme show: the newest that is complete. */
export const SHOWN_RUN = `select r.id from runs r join run_states s on s.run_id = r.id
  where r.scheme_id = $1 and s.state = 'complete' order by r.number desc limit 1`;

/** The run that the register of a scheme shows; null where none is complete. */
export async function findShownRun(
  database: Sequelize,
  schemeId: string,
  transaction?: Transaction,
): Promise<string | null> {
  const [run] = await database.query<{ id: string }>(SHOWN_RUN, {
    type: QueryTypes.SELECT,
    bind: [schemeId],
    ...(transaction !== undefined && { transaction }),
  });
  return run?.id ?? null;
}
