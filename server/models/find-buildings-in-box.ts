import { QueryTypes, type Sequelize } from 'sequelize';
import type { Position } from 'geojson';

/** West, south, east and north in degrees. */
export type LonLatBox = [number, number, number, number];

export type DrawnBuilding = {
  readonly id: number;
  readonly reference: string;
  readonly name: string | null;
  readonly lonLat: Position[][][];
};

/** That a building's box meets one from $2 to $5, written as in the index, or the index is not used. */
export const MEETS_BOX =
  'box(point(west, south), point(east, north)) && box(point($2, $3), point($4, $5))';

/** The buildings of a scheme that may reach into a box. */
export async function findBuildingsInBox(
  database: Sequelize,
  schemeId: string,
  [west, south, east, north]: LonLatBox,
): Promise<DrawnBuilding[]> {
  return database.query<DrawnBuilding>(
    `select id, reference, name, lon_lat as "lonLat"
     from buildings join building_footprints on building_id = id
     where scheme_id = $1 and removed_at is null
       and ${MEETS_BOX}
     order by id`,
    { type: QueryTypes.SELECT, bind: [schemeId, west, south, east, north] },
  );
}
