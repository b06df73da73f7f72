import { QueryTypes, type Sequelize } from 'sequelize';
import type { Box } from '../../shared/geometry/bounding-box.ts';
import { MEETS_BOX } from './find-buildings-in-box.ts';
import type { Neighbour } from './find-neighbours.ts';

/** The numbers of a scheme's buildings whose boxes meet another, in degrees, ascending. */
export async function findIdsInBox(
  database: Sequelize,
  schemeId: string,
  { west, south, east, north }: Box,
): Promise<number[]> {
  const rows = await database.query<{ id: number }>(
    `select id from buildings where scheme_id = $1 and removed_at is null
       and ${MEETS_BOX}
     order by id`,
    { type: QueryTypes.SELECT, bind: [schemeId, west, south, east, north] },
  );
  return rows.map(({ id }) => id);
}

/** Buildings with their references and footprints, by their numbers. */
export async function findOutlines(
  database: Sequelize,
  ids: readonly number[],
): Promise<Neighbour[]> {
  return database.query<Neighbour>(
    `select id, reference, footprint from buildings join building_footprints on building_id = id
     where id = any($1) order by id`,
    { type: QueryTypes.SELECT, bind: [ids] },
  );
}
