import { QueryTypes, type Sequelize } from 'sequelize';
import type { FootprintRings } from './building-footprint.ts';

export type Neighbour = {
  readonly id: number;
  readonly reference: string;
  readonly footprint: FootprintRings;
};

/** A metre and more on the ground, anywhere on earth where towns are. */
const MARGIN = 0.00003;
/** More stand against no building. */
const MOST = 500;

/** The buildings whose boxes meet that of a building, or nearly so. */
export async function findNeighbours(
  database: Sequelize,
  building: {
    readonly id: number;
    readonly schemeId: string;
    readonly west: number;
    readonly south: number;
    readonly east: number;
    readonly north: number;
  },
): Promise<Neighbour[]> {
  const { id, schemeId, west, south, east, north } = building;
  return database.query<Neighbour>(
    `select id, reference, footprint
     from buildings join building_footprints on building_id = id
     where scheme_id = $1 and removed_at is null and id <> $2
       and box(point(west, south), point(east, north)) && box(point($3, $4), point($5, $6))
     order by id limit ${MOST}`,
    {
      type: QueryTypes.SELECT,
      bind: [schemeId, id, west - MARGIN, south - MARGIN, east + MARGIN, north + MARGIN],
    },
  );
}
