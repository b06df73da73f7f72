import type { Geometry } from 'geojson';
import { QueryTypes, type Sequelize } from 'sequelize';
import type { BackgroundLayer } from '../../shared/schemas/background.ts';
import type { LonLatBox } from './find-buildings-in-box.ts';

export type DrawnBackground = {
  readonly layer: BackgroundLayer;
  readonly name: string | null;
  readonly geometry: Geometry;
};

/**
 * The background of a scheme that may reach into a box, but for what is smaller than `least` degrees. The
 * box is written as in the index, or it is not used.
 */
export async function findBackgroundInBox(
  database: Sequelize,
  schemeId: string,
  [west, south, east, north]: LonLatBox,
  least: number,
): Promise<DrawnBackground[]> {
  return database.query<DrawnBackground>(
    `select layer, name, geometry
     from background_features
     where scheme_id = $1
       and box(point(west, south), point(east, north)) && box(point($2, $3), point($4, $5))
       and greatest(east - west, north - south) >= $6
     order by id`,
    { type: QueryTypes.SELECT, bind: [schemeId, west, south, east, north, least] },
  );
}
