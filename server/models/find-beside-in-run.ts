import { QueryTypes, type Sequelize } from 'sequelize';

/** Who comes before and after a building in the order of references; null at either end. */
export type BesideInRun = { readonly previous: number | null; readonly next: number | null };

const REFERENCE = "(s.facts ->> 'reference') collate natural_order";

function nearestSql(side: '<' | '>'): string {
  const direction = side === '<' ? 'desc' : 'asc';
  return `(
    select r.building_id
    from run_buildings r join building_snapshots s using (building_id, version), here
    where r.run_id = $1 and (${REFERENCE}, r.building_id) ${side} (here.reference, here.id)
    order by ${REFERENCE} ${direction}, r.building_id ${direction} limit 1
  )`;
}

/** The buildings of a run that come before and after one of them, by the references that the run took. */
export async function findBesideInRun(
  database: Sequelize,
  runId: string,
  buildingId: number,
): Promise<BesideInRun> {
  const [row] = await database.query<BesideInRun>(
    `with here as materialized (
       select r.building_id as id, ${REFERENCE} as reference
       from run_buildings r join building_snapshots s using (building_id, version)
       where r.run_id = $1 and r.building_id = $2
     )
     select ${nearestSql('<')} as previous, ${nearestSql('>')} as next`,
    { type: QueryTypes.SELECT, bind: [runId, buildingId] },
  );
  return row ?? { previous: null, next: null };
}
