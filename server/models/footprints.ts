import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { FootprintRings } from './building-footprint.ts';

export type KeptFootprint = {
  readonly id: number;
  readonly footprint: FootprintRings;
  readonly lonLat: FootprintRings;
};

/** Puts footprints in place of what was there. */
export async function writeFootprints(
  database: Sequelize,
  rows: readonly KeptFootprint[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into building_footprints (building_id, footprint, lon_lat)
     select * from unnest($1::integer[], $2::jsonb[], $3::jsonb[])
     on conflict (building_id) do update
       set footprint = excluded.footprint, lon_lat = excluded.lon_lat`,
    {
      bind: [
        rows.map(({ id }) => id),
        rows.map(({ footprint }) => JSON.stringify(footprint)),
        rows.map(({ lonLat }) => JSON.stringify(lonLat)),
      ],
      transaction,
    },
  );
}

/** The footprints of some buildings, in the scheme's grid, by their numbers. */
export async function findFootprints(
  database: Sequelize,
  ids: readonly number[],
  transaction?: Transaction,
): Promise<Map<number, FootprintRings>> {
  const rows = await database.query<{ id: number; footprint: FootprintRings }>(
    `select building_id as id, footprint from building_footprints where building_id = any($1)`,
    { type: QueryTypes.SELECT, bind: [ids], transaction: transaction ?? null },
  );
  return new Map(rows.map(({ id, footprint }) => [id, footprint]));
}

/** The same in longitude and latitude. */
export async function findLonLat(
  database: Sequelize,
  ids: readonly number[],
): Promise<Map<number, FootprintRings>> {
  const rows = await database.query<{ id: number; lonLat: FootprintRings }>(
    `select building_id as id, lon_lat as "lonLat" from building_footprints where building_id = any($1)`,
    { type: QueryTypes.SELECT, bind: [ids] },
  );
  return new Map(rows.map(({ id, lonLat }) => [id, lonLat]));
}
