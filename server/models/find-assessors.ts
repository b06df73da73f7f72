import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** Those who can be given buildings: the assessors of a scheme who may sign in, by name. */
export function findAssessors(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction | null = null,
): Promise<{ id: string; name: string }[]> {
  return database.query<{ id: string; name: string }>(
    `select p.id, p.name from memberships m join people p on p.id = m.person_id
     where m.scheme_id = $1 and m.role = 'assessor' and p.shut_out_at is null
     order by p.name collate "und-x-icu", p.id`,
    { type: QueryTypes.SELECT, bind: [schemeId], transaction },
  );
}
