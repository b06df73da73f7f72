import { QueryTypes, type Sequelize } from 'sequelize';

/** How many features each layer of a scheme's background holds; a layer of none is not there. */
export async function countBackground(
  database: Sequelize,
  schemeId: string,
): Promise<ReadonlyMap<string, number>> {
  const rows = await database.query<{ layer: string; features: number }>(
    `select layer, count(*)::integer as features
     from background_features where scheme_id = $1 group by layer`,
    { type: QueryTypes.SELECT, bind: [schemeId] },
  );
  return new Map(rows.map(({ layer, features }) => [layer, features]));
}
