import { QueryTypes, type Sequelize } from 'sequelize';
import { OUTLINE_LIMITS } from '../../shared/schemas/building-outlines.ts';
import type { RunFacts } from '../../shared/schemas/runs.ts';
import { MEETS_BOX, type LonLatBox } from './find-buildings-in-box.ts';

export type RunOutline = { readonly id: number; readonly parts: RunFacts['parts'] };

/** What a run took to stand in a box; found by where it stands by now, drawn as the run had it. */
export async function findRunOutlines(
  database: Sequelize,
  schemeId: string,
  runId: string,
  [west, south, east, north]: LonLatBox,
): Promise<RunOutline[]> {
  return database.query<RunOutline>(
    `select r.building_id as id, s.facts->'parts' as parts
     from run_buildings r join building_snapshots s using (building_id, version)
     where r.run_id = $6 and r.building_id in (
       select id from buildings where scheme_id = $1 and ${MEETS_BOX}
     )
     order by r.building_id limit ${OUTLINE_LIMITS.buildings}`,
    { type: QueryTypes.SELECT, bind: [schemeId, west, south, east, north, runId] },
  );
}
