import type { Geometry } from 'geojson';
import { QueryTypes, type Sequelize } from 'sequelize';
import type { BackgroundLayer } from '../../shared/schemas/background.ts';
import type { LonLatBox } from './find-buildings-in-box.ts';

export type DrawnBackground = {
  readonly layer: BackgroundLayer;
  readonly name: string | null;
  readonly geometry: Geometry;
};

/** What of a background is wanted: all that is as large as `least` degrees, of one layer or of all. */
type Wanted = {
  readonly least: number;
  readonly layer?: BackgroundLayer;
  /** How many at most, the largest. */
  readonly most?: number;
};

/**
 * The background of a scheme that may reach into a box, but for what is too small. The box is written as in
 * the index, or it is not used.
 */
export async function findBackgroundInBox(
  database: Sequelize,
  schemeId: string,
  [west, south, east, north]: LonLatBox,
  { least, layer, most }: Wanted,
): Promise<DrawnBackground[]> {
  const order = most === undefined ? 'id' : 'greatest(east - west, north - south) desc, id';
  return database.query<DrawnBackground>(
    `select layer, name, geometry
     from background_features
     where scheme_id = $1
       and box(point(west, south), point(east, north)) && box(point($2, $3), point($4, $5))
       and greatest(east - west, north - south) >= $6
       and ($7::text is null or layer = $7)
     order by ${order} limit $8`,
    {
      type: QueryTypes.SELECT,
      bind: [schemeId, west, south, east, north, least, layer ?? null, most ?? null],
    },
  );
}
