import { QueryTypes, type Sequelize } from 'sequelize';
import { OUTLINE_LIMITS } from '../../shared/schemas/building-outlines.ts';
import type { FootprintRings } from './building-footprint.ts';
import { MEETS_BOX, type LonLatBox } from './find-buildings-in-box.ts';

export type OutlinedBuilding = {
  readonly id: number;
  readonly reference: string;
  readonly name: string | null;
  readonly storeys: number | null;
  readonly eavesHeight: number | null;
  readonly footprint: FootprintRings;
};

/** The buildings of a scheme that may reach into a box, with how high they are. */
export async function findOutlinesInBox(
  database: Sequelize,
  schemeId: string,
  [west, south, east, north]: LonLatBox,
): Promise<OutlinedBuilding[]> {
  return database.query<OutlinedBuilding>(
    `select id, reference, name, storeys, eaves_height as "eavesHeight", footprint
     from buildings join building_footprints on building_id = id
     where scheme_id = $1 and removed_at is null
       and ${MEETS_BOX}
     order by id limit ${OUTLINE_LIMITS.buildings}`,
    { type: QueryTypes.SELECT, bind: [schemeId, west, south, east, north] },
  );
}
