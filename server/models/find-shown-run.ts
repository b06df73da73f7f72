import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** The run that the register and the plan of a scheme show: the newest that is complete. */
export const SHOWN_RUN = `select r.id from runs r join run_states s on s.run_id = r.id
  where r.scheme_id = $1 and s.state = 'complete' order by r.number desc limit 1`;

/** A run with the option that it is of. */
export type ShownRun = { readonly runId: string; readonly optionId: string };

/** The run that the register of a scheme shows, with its option; nulls where none is complete. */
export async function findShownRun(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction | null = null,
): Promise<ShownRun | { readonly runId: null; readonly optionId: null }> {
  const [run] = await database.query<ShownRun>(
    `select id as "runId", alignment_id as "optionId" from runs where id = (${SHOWN_RUN})`,
    { type: QueryTypes.SELECT, bind: [schemeId], transaction },
  );
  return run ?? { runId: null, optionId: null };
}
