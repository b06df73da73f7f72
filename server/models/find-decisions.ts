import { QueryTypes, type Sequelize } from 'sequelize';
import type { BasisChange } from '../../shared/assessment/conclusion.ts';
import type { DecisionBasis } from '../../shared/schemas/decision-answers.ts';

/** A decision with the names of its people and what has changed since, as its presenter wants it. */
export type FoundDecision = {
  readonly id: string;
  readonly buildingId: number;
  readonly runId: string;
  readonly runNumber: number;
  readonly option: string;
  readonly rulesVersion: number;
  readonly buildingVersion: number;
  readonly kind: string;
  readonly category: number | null;
  readonly reason: string;
  readonly basis: DecisionBasis;
  readonly batchId: string;
  readonly batchSize: number;
  readonly preparedBy: { readonly id: string; readonly name: string };
  readonly preparedAt: Date;
  readonly state: string;
  readonly checkedBy: { readonly id: string; readonly name: string } | null;
  readonly checkedAt: Date | null;
  readonly comment: string | null;
  readonly changes: readonly BasisChange[] | null;
  readonly changedRun: number | null;
  readonly changedRules: number | null;
  readonly changedAt: Date | null;
};

const MOST = 200;

/** The decisions on a building for an option, the newest first. */
export function findDecisions(
  database: Sequelize,
  optionId: string,
  buildingId: number,
): Promise<FoundDecision[]> {
  return database.query<FoundDecision>(
    `select d.id, d.building_id as "buildingId", d.run_id as "runId", r.number as "runNumber",
       r.option_name as option, d.rules_version as "rulesVersion",
       d.building_version as "buildingVersion", d.kind, d.category, d.reason, d.basis,
       d.batch_id as "batchId",
       (select count(*) from decisions b where b.batch_id = d.batch_id)::integer as "batchSize",
       json_build_object('id', p.id, 'name', p.name) as "preparedBy", d.prepared_at as "preparedAt",
       d.state,
       case when c.id is not null then json_build_object('id', c.id, 'name', c.name) end
         as "checkedBy",
       d.checked_at as "checkedAt", d.comment,
       m.changes, m.rules_version as "changedRules", m.found_at as "changedAt",
       (select number from runs where id = m.run_id) as "changedRun"
     from decisions d
     join runs r on r.id = d.run_id
     join people p on p.id = d.prepared_by
     left join people c on c.id = d.checked_by
     left join decision_marks m on m.decision_id = d.id
     where d.alignment_id = $1 and d.building_id = $2
     order by d.prepared_at desc, d.id limit ${MOST}`,
    { type: QueryTypes.SELECT, bind: [optionId, buildingId] },
  );
}

/** Whose a building is. */
export async function findAssignee(
  database: Sequelize,
  buildingId: number,
): Promise<{ id: string; name: string } | null> {
  const [person] = await database.query<{ id: string; name: string }>(
    `select p.id, p.name from building_assignments g join people p on p.id = g.person_id
     where g.building_id = $1`,
    { type: QueryTypes.SELECT, bind: [buildingId] },
  );
  return person ?? null;
}
