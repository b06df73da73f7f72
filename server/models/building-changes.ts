import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { FootprintRings } from './building-footprint.ts';

/** What changed of one building: null before where it came in, null after where it was taken out. */
export type BuildingChange = {
  readonly buildingId: number;
  /** The version that the change left. */
  readonly version: number;
  readonly before: object | null;
  readonly after: object | null;
};

function json(value: object | null): string | null {
  return value === null ? null : JSON.stringify(value);
}

/** Writes what a change did to each building. */
export async function insertBuildingChanges(
  database: Sequelize,
  changeId: string,
  rows: readonly BuildingChange[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into building_changes (change_id, building_id, version, before, after)
     select $1, given.* from unnest($2::integer[], $3::integer[], $4::jsonb[], $5::jsonb[]) as given`,
    {
      bind: [
        changeId,
        rows.map(({ buildingId }) => buildingId),
        rows.map(({ version }) => version),
        rows.map(({ before }) => json(before)),
        rows.map(({ after }) => json(after)),
      ],
      transaction,
    },
  );
}

/** The footprints that some buildings had before others took their place, by the buildings' numbers. */
export async function findEarlierFootprints(
  database: Sequelize,
  ids: readonly number[],
): Promise<Map<number, FootprintRings[]>> {
  const rows = await database.query<{ id: number; footprints: FootprintRings[] }>(
    `select building_id as id, jsonb_agg(before->'footprint') as footprints
     from building_changes where building_id = any($1) and before ? 'footprint'
     group by building_id`,
    { type: QueryTypes.SELECT, bind: [ids] },
  );
  return new Map(rows.map(({ id, footprints }) => [id, footprints]));
}
