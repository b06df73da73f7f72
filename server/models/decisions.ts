import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { BasisChange } from '../../shared/assessment/conclusion.ts';
import type { DecisionKind } from '../../shared/schemas/decisions.ts';
import type { DecisionBasis } from '../../shared/schemas/decision-answers.ts';
import { AppError } from '../errors.ts';

/** What is the same in all decisions of a batch. */
export type DecisionBatch = {
  readonly schemeId: string;
  readonly optionId: string;
  readonly runId: string;
  readonly rulesVersion: number;
  readonly kind: DecisionKind;
  readonly category: number | null;
  readonly reason: string;
  readonly batchId: string;
  readonly preparedBy: string;
};

export type PreparedDecision = {
  readonly id: number;
  readonly version: number;
  readonly basis: DecisionBasis;
};

/** Keeps what was prepared for some buildings, each a decision of its own. */
export async function insertDecisions(
  database: Sequelize,
  batch: DecisionBatch,
  prepared: readonly PreparedDecision[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into decisions (id, scheme_id, alignment_id, run_id, rules_version, kind, category,
       reason, batch_id, prepared_by, building_id, building_version, basis)
     select gen_random_uuid(), $1, $2, $3, $4, $5, $6, $7, $8, $9, given.id, given.version, given.basis
     from jsonb_to_recordset($10::jsonb) as given (id integer, version integer, basis jsonb)`,
    {
      bind: [
        ...[batch.schemeId, batch.optionId, batch.runId, batch.rulesVersion, batch.kind],
        ...[batch.category, batch.reason, batch.batchId, batch.preparedBy],
        JSON.stringify(prepared),
      ],
      transaction,
    },
  );
}

/** A decision that waits, as far as a check asks. */
export type WaitingDecision = {
  readonly id: string;
  readonly buildingId: number;
  readonly kind: DecisionKind;
  readonly preparedBy: string;
  readonly isChanged: boolean;
};

/** The decisions that wait on some buildings for an option. */
export function findWaiting(
  database: Sequelize,
  optionId: string,
  ids: readonly number[],
  transaction: Transaction | null,
): Promise<WaitingDecision[]> {
  return database.query<WaitingDecision>(
    `select d.id, d.building_id as "buildingId", d.kind, d.prepared_by as "preparedBy",
       m.decision_id is not null as "isChanged"
     from decisions d left join decision_marks m on m.decision_id = d.id
     where d.alignment_id = $1 and d.building_id = any($2) and d.state = 'waiting for check'
     order by d.building_id`,
    { type: QueryTypes.SELECT, bind: [optionId, ids], transaction },
  );
}

/** The verdict of a check: by whom, and what was said. */
export type Verdict = {
  readonly state: 'checked' | 'returned';
  readonly by: string;
  readonly comment: string;
};

/**
 * Moves decisions that wait on to a verdict. One that comes into force supersedes the one before it on the
 * same building.
 */
export async function closeDecisions(
  database: Sequelize,
  ids: readonly string[],
  { state, by, comment }: Verdict,
  transaction: Transaction,
): Promise<void> {
  if (state === 'checked') {
    await database.query(
      `update decisions old set state = 'superseded', superseded_by = new.id
       from decisions new
       where new.id = any($1::uuid[]) and old.state = 'checked'
         and old.alignment_id = new.alignment_id and old.building_id = new.building_id`,
      { bind: [ids], transaction },
    );
  }
  await database.query(
    `update decisions set state = $2, checked_by = $3, checked_at = now(), comment = nullif($4, '')
     where id = any($1::uuid[])`,
    { bind: [ids, state, by, comment], transaction },
  );
}

/** A decision that is in force or waits, with what it rests on. */
export type LiveDecision = {
  readonly id: string;
  readonly buildingId: number;
  readonly basis: DecisionBasis;
};

const AT_ONCE = 2000;

/** The decisions for an option that are in force or wait, on some buildings or on all, part by part. */
export async function* findLiveDecisions(
  database: Sequelize,
  optionId: string,
  ids: readonly number[] | null,
  transaction: Transaction,
): AsyncGenerator<LiveDecision[]> {
  let last: LiveDecision | undefined;
  for (;;) {
    const some: LiveDecision[] = await database.query<LiveDecision>(
      `select id, building_id as "buildingId", basis from decisions
       where alignment_id = $1 and state in ('checked', 'waiting for check')
         and ($2::integer[] is null or building_id = any($2))
         and ($3::integer is null or (building_id, id) > ($3, $4::uuid))
       order by building_id, id limit ${AT_ONCE}`,
      {
        type: QueryTypes.SELECT,
        bind: [optionId, ids, last?.buildingId ?? null, last?.id ?? null],
        transaction,
      },
    );
    if (some.length > 0) yield some;
    if (some.length < AT_ONCE) return;
    last = some.at(-1);
  }
}

export type DecisionMark = { readonly id: string; readonly changes: readonly BasisChange[] };

/** Writes what has changed of some decisions' basis, in place of what was found before. */
export async function replaceMarks(
  database: Sequelize,
  looked: readonly string[],
  found: readonly DecisionMark[],
  by: { readonly runId: string; readonly rulesVersion: number },
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `delete from decision_marks where decision_id = any($1::uuid[]) and decision_id <> all($2::uuid[])`,
    { bind: [looked, found.map(({ id }) => id)], transaction },
  );
  await database.query(
    `insert into decision_marks (decision_id, run_id, rules_version, changes)
     select given.id, $2, $3, given.changes
     from jsonb_to_recordset($1::jsonb) as given (id uuid, changes jsonb)
     on conflict (decision_id) do update set run_id = excluded.run_id,
       rules_version = excluded.rules_version, changes = excluded.changes, found_at = now()
     where decision_marks.changes <> excluded.changes`,
    { bind: [JSON.stringify(found), by.runId, by.rulesVersion], transaction },
  );
}

/** Works out anew where some buildings stand for an option. */
export async function refreshStandings(
  database: Sequelize,
  optionId: string,
  ids: readonly number[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    'delete from building_standings where alignment_id = $1 and building_id = any($2)',
    { bind: [optionId, ids], transaction },
  );
  await database.query(
    `insert into building_standings (alignment_id, building_id, state, kind, decision_id, prepared_by)
     select distinct on (d.building_id) $1, d.building_id,
       case when m.decision_id is not null then 'to look at again'
         when d.state = 'checked' then 'decided' else d.state end,
       d.kind, d.id, d.prepared_by
     from decisions d left join decision_marks m on m.decision_id = d.id
     where d.alignment_id = $1 and d.building_id = any($2)
       and d.state in ('waiting for check', 'returned', 'checked')
     order by d.building_id, d.prepared_at desc, d.id`,
    { bind: [optionId, ids], transaction },
  );
}

/** One decision as far as moving it asks. */
export type DecisionPlace = {
  readonly id: string;
  readonly optionId: string;
  readonly buildingId: number;
  readonly preparedBy: string;
  readonly state: string;
  readonly isChanged: boolean;
};

/** A decision of a scheme; of another scheme it is not there. */
export async function findDecision(
  database: Sequelize,
  schemeId: string,
  id: string,
  transaction: Transaction,
): Promise<DecisionPlace> {
  const [found] = await database.query<DecisionPlace>(
    `select d.id, d.alignment_id as "optionId", d.building_id as "buildingId",
       d.prepared_by as "preparedBy", d.state, m.decision_id is not null as "isChanged"
     from decisions d left join decision_marks m on m.decision_id = d.id
     where d.scheme_id = $1 and d.id = $2`,
    { type: QueryTypes.SELECT, bind: [schemeId, id], transaction },
  );
  if (found === undefined) throw new AppError('not-found');
  return found;
}

/** Takes decisions back that wait. */
export async function withdrawWaiting(
  database: Sequelize,
  ids: readonly string[],
  transaction: Transaction,
): Promise<void> {
  await database.query(`update decisions set state = 'withdrawn' where id = any($1::uuid[])`, {
    bind: [ids],
    transaction,
  });
}
