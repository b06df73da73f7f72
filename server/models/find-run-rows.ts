import { QueryTypes, type Sequelize } from 'sequelize';
import type { RunFacts, RunResult } from '../../shared/schemas/runs.ts';
import { findPackedIds } from './find-packed-ids.ts';
import { RESULT_RECORD } from './run-results.ts';

/** A building as a run took it, with what was found of it; its footprint only where it is asked for. */
export type RunRow = {
  readonly facts: Omit<RunFacts, 'parts'>;
  readonly parts: RunFacts['parts'] | null;
  readonly result: RunResult;
};

/** The numbers of all buildings of a run, by the references that it took, four bytes each. */
export function findRunOrder(database: Sequelize, runId: string): Promise<Buffer> {
  return findPackedIds(
    database,
    `select r.building_id as id
     from run_buildings r join building_snapshots s using (building_id, version)
     where r.run_id = $1
     order by (s.facts ->> 'reference') collate natural_order, r.building_id`,
    [runId],
  );
}

/** Some buildings of a complete run in the order of their numbers here. */
export async function findRunRows(
  database: Sequelize,
  { runId, ids, isDrawn }: { runId: string; ids: readonly number[]; isDrawn: boolean },
): Promise<RunRow[]> {
  const rows = await database.query<Pick<RunRow, 'facts' | 'parts'> & RunResult>(
    `select s.facts - 'parts' as facts, ${isDrawn ? "s.facts -> 'parts'" : 'null'} as parts,
       ${RESULT_RECORD}
     from unnest($2::integer[]) with ordinality as asked (building_id, place)
     join run_buildings r using (building_id)
     join building_snapshots s using (building_id, version)
     join run_results f using (run_id, building_id)
     where r.run_id = $1 order by asked.place`,
    { type: QueryTypes.SELECT, bind: [runId, ids] },
  );
  return rows.map(({ facts, parts, ...result }) => ({ facts, parts, result }));
}
