import { QueryTypes, type Sequelize } from 'sequelize';
import type { FootprintRings } from './building-footprint.ts';

/** A building as its owner is shown it. */
export type FoundOwnBuilding = {
  readonly id: number;
  readonly name: string | null;
  readonly address: string | null;
  readonly use: string | null;
  readonly outline: FootprintRings;
  readonly measures: readonly { readonly title: string; readonly state: string }[];
};

/** Some buildings of a scheme with the measures that are agreed for them or further on, by their addresses. */
export function findOwnBuildings(
  database: Sequelize,
  schemeId: string,
  ids: readonly number[],
): Promise<FoundOwnBuilding[]> {
  return database.query<FoundOwnBuilding>(
    `select b.id, b.name, b.address, b.use, f.lon_lat as outline,
       coalesce((
         select json_agg(json_build_object('title', m.title, 'state', m.state)
           order by m.due nulls last, m.title collate natural_order)
         from measures m join measure_buildings mb on mb.measure_id = m.id
         where mb.building_id = b.id and m.scheme_id = $1
           and m.state in ('agreed', 'in place', 'done')
       ), '[]') as measures
     from buildings b join building_footprints f on f.building_id = b.id
     where b.scheme_id = $1 and b.id = any($2::integer[]) and b.removed_at is null
     order by b.address collate natural_order nulls last, b.id`,
    { type: QueryTypes.SELECT, bind: [schemeId, ids] },
  );
}
