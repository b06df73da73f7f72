import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { RegisterOf } from './register-condition.ts';

/** Buildings that are alike, four bytes a number. */
type StandingGroup = { readonly value: string; readonly ids: Buffer };

type Columns = 'state' | 'kind';

async function groups(
  database: Sequelize,
  query: string,
  bind: unknown,
  transaction: Transaction | null,
): Promise<StandingGroup[]> {
  return database.query<StandingGroup>(query, {
    type: QueryTypes.SELECT,
    bind: [bind],
    transaction,
  });
}

/** The buildings that something is decided of for an option, by their state or by what it is. */
export function findStandingGroups(
  database: Sequelize,
  { optionId }: Pick<RegisterOf, 'optionId'>,
  column: Columns,
  transaction: Transaction | null,
): Promise<StandingGroup[]> {
  return groups(
    database,
    `select ${column} as value, string_agg(int4send(building_id), '') as ids
     from building_standings where alignment_id = $1 group by ${column}`,
    optionId,
    transaction,
  );
}

/** The buildings that are somebody's, by their names. */
export function findAssignedGroups(
  database: Sequelize,
  { schemeId }: Pick<RegisterOf, 'schemeId'>,
  transaction: Transaction | null,
): Promise<StandingGroup[]> {
  return groups(
    database,
    `select p.name as value, string_agg(int4send(g.building_id), '') as ids
     from building_assignments g
     join buildings b on b.id = g.building_id
     join people p on p.id = g.person_id
     where b.scheme_id = $1 group by p.name`,
    schemeId,
    transaction,
  );
}
