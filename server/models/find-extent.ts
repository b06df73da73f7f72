import { QueryTypes, type Sequelize } from 'sequelize';
import type { LonLatBox } from './find-buildings-in-box.ts';

type Row = { bounds: LonLatBox | null };

async function boundsOf(
  database: Sequelize,
  table: 'buildings' | 'background_features',
  schemeId: string,
): Promise<LonLatBox | undefined> {
  const [row] = await database.query<Row>(
    `select case when count(*) > 0
       then array[min(west), min(south), max(east), max(north)] end as bounds
     from ${table} where scheme_id = $1`,
    { type: QueryTypes.SELECT, bind: [schemeId] },
  );
  return row?.bounds ?? undefined;
}

/** Round a scheme's buildings, else round its background; undefined where it has neither. */
export async function findExtent(
  database: Sequelize,
  schemeId: string,
): Promise<{ bounds: LonLatBox; from: 'buildings' | 'background' } | undefined> {
  const buildings = await boundsOf(database, 'buildings', schemeId);
  if (buildings !== undefined) return { bounds: buildings, from: 'buildings' };
  const background = await boundsOf(database, 'background_features', schemeId);
  return background === undefined ? undefined : { bounds: background, from: 'background' };
}
