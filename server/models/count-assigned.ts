import { QueryTypes, type Sequelize } from 'sequelize';

/** How many buildings are somebody's. */
export async function countAssigned(
  database: Sequelize,
  schemeId: string,
  personId: string,
): Promise<number> {
  const [row] = await database.query<{ count: number }>(
    `select count(*)::integer as count from building_assignments g
     join buildings b on b.id = g.building_id
     where b.scheme_id = $1 and b.removed_at is null and g.person_id = $2`,
    { type: QueryTypes.SELECT, bind: [schemeId, personId] },
  );
  return row?.count ?? 0;
}
