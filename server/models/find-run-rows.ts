import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { DecisionNow } from '../../shared/presentation/decision-words.ts';
import type { EvidenceLayout } from '../../shared/schemas/evidence.ts';
import type { RunFacts, RunResult } from '../../shared/schemas/runs.ts';
import { findPackedIds } from './find-packed-ids.ts';
import { RESULT_RECORD } from './run-results.ts';

/**
 * A building as a run took it, with what was found of it, and what is decided of it now for the run's option;
 * its footprint only where it is asked for.
 */
export type RunRow = {
  readonly facts: Omit<RunFacts, 'parts'>;
  readonly parts: RunFacts['parts'] | null;
  readonly result: RunResult;
  readonly now: DecisionNow | null;
};

type RowsMeant = Extract<EvidenceLayout, { kind: 'schedule' }>['rows'];

/**
 * The numbers of the buildings of a run, by the references that it took, four bytes each: all of them, or
 * those that stage 1 does not let go.
 */
export function findRunOrder(
  database: Sequelize,
  runId: string,
  meant: RowsMeant = 'all',
): Promise<Buffer> {
  const affected = 'join run_results f using (run_id, building_id)';
  return findPackedIds(
    database,
    `select r.building_id as id
     from run_buildings r join building_snapshots s using (building_id, version)
     ${meant === 'all' ? '' : affected}
     where r.run_id = $1 ${meant === 'all' ? '' : 'and f.stage > 1'}
     order by (s.facts ->> 'reference') collate natural_order, r.building_id`,
    [runId],
  );
}

const NOW = `(
  select jsonb_build_object('state', t.state, 'kind', t.kind, 'category', d.category)
  from runs o
  join building_standings t on t.alignment_id = o.alignment_id
  join decisions d on d.id = t.decision_id
  where o.id = r.run_id and t.building_id = r.building_id
)`;

/** Some buildings of a complete run in the order of their numbers here. */
export async function findRunRows(
  database: Sequelize,
  { runId, ids, isDrawn }: { runId: string; ids: readonly number[]; isDrawn: boolean },
  transaction: Transaction | null = null,
): Promise<RunRow[]> {
  const rows = await database.query<Omit<RunRow, 'result'> & RunResult>(
    `select s.facts - 'parts' as facts, ${isDrawn ? "s.facts -> 'parts'" : 'null'} as parts,
       ${NOW} as now, ${RESULT_RECORD}
     from unnest($2::integer[]) with ordinality as asked (building_id, place)
     join run_buildings r using (building_id)
     join building_snapshots s using (building_id, version)
     join run_results f using (run_id, building_id)
     where r.run_id = $1 order by asked.place`,
    { type: QueryTypes.SELECT, bind: [runId, ids], transaction },
  );
  return rows.map(({ facts, parts, now, ...result }) => ({ facts, parts, now, result }));
}
