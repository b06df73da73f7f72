import { QueryTypes, type Sequelize } from 'sequelize';

/** How many decisions wait for a person in a scheme, and since when. */
export type DecisionsWaiting = {
  readonly schemeId: string;
  readonly toCheck: number;
  readonly toCheckSince: Date | null;
  readonly returned: number;
  readonly returnedSince: Date | null;
  readonly again: number;
  readonly againSince: Date | null;
};

const OPEN = `t.state = 'waiting for check' and t.prepared_by <> $2`;
const RETURNED = `t.state = 'returned' and t.prepared_by = $2`;
const AGAIN = `t.state = 'to look at again'`;

/** What waits for a person of some schemes, each by the option of its run that is shown. */
export function findDecisionsWaiting(
  database: Sequelize,
  schemeIds: readonly string[],
  personId: string,
): Promise<DecisionsWaiting[]> {
  return database.query<DecisionsWaiting>(
    `with shown as (
       select distinct on (r.scheme_id) r.scheme_id, r.alignment_id
       from runs r join run_states s on s.run_id = r.id
       where r.scheme_id = any($1::uuid[]) and s.state = 'complete'
       order by r.scheme_id, r.number desc
     )
     select shown.scheme_id as "schemeId",
       count(*) filter (where ${OPEN})::integer as "toCheck",
       min(d.prepared_at) filter (where ${OPEN}) as "toCheckSince",
       count(*) filter (where ${RETURNED})::integer as returned,
       min(d.checked_at) filter (where ${RETURNED}) as "returnedSince",
       count(*) filter (where ${AGAIN})::integer as again,
       min(m.found_at) filter (where ${AGAIN}) as "againSince"
     from shown
     join building_standings t on t.alignment_id = shown.alignment_id
     join buildings b on b.id = t.building_id and b.removed_at is null
     join decisions d on d.id = t.decision_id
     left join decision_marks m on m.decision_id = d.id
     group by shown.scheme_id`,
    { type: QueryTypes.SELECT, bind: [schemeIds, personId] },
  );
}
