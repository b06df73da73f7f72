import { QueryTypes, type Sequelize } from 'sequelize';
import type { PlanBuilding } from '../../shared/evidence/plan-material.ts';
import type { LonLatBox } from './find-buildings-in-box.ts';

/**
 * What a run took to stand in a box and what it found, by reference; sought and drawn as it stood then.
 * The box is written as in the index, or it is not used.
 */
export function findPlanBuildings(
  database: Sequelize,
  runId: string,
  [west, south, east, north]: LonLatBox,
  most: number,
): Promise<PlanBuilding[]> {
  return database.query<PlanBuilding>(
    `select r.building_id::text as id, s.facts->>'reference' as reference,
       s.facts->>'address' as address, s.facts->'parts' as parts,
       jsonb_build_object(
         'stage', o.stage, 'settlement', o.settlement, 'strain', o.strain,
         'categoryLow', o.category_low, 'category', o.category, 'categoryHigh', o.category_high,
         'breakpointVolumeLoss', o.breakpoint_volume_loss
       ) as result
     from building_snapshots s
     join run_buildings r using (building_id, version)
     join run_results o on o.run_id = r.run_id and o.building_id = r.building_id
     where r.run_id = $5
       and box(point(s.west, s.south), point(s.east, s.north)) && box(point($1, $2), point($3, $4))
     order by s.facts->>'reference' collate natural_order, r.building_id limit $6`,
    { type: QueryTypes.SELECT, bind: [west, south, east, north, runId, most] },
  );
}
