import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** An option that has decisions, with its newest complete run. */
export type OptionDecided = { readonly optionId: string; readonly runId: string };

/** The options of a scheme that something is decided for or waits to be. */
export function findOptionsDecided(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction,
): Promise<OptionDecided[]> {
  return database.query<OptionDecided>(
    `select distinct on (r.alignment_id) r.alignment_id as "optionId", r.id as "runId"
     from runs r join run_states s on s.run_id = r.id
     where r.scheme_id = $1 and s.state = 'complete' and exists (
       select from decisions d where d.alignment_id = r.alignment_id
         and d.state in ('checked', 'waiting for check')
     )
     order by r.alignment_id, r.number desc`,
    { type: QueryTypes.SELECT, bind: [schemeId], transaction },
  );
}
