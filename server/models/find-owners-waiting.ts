import { QueryTypes, type Sequelize } from 'sequelize';

type Counted = { readonly count: number; readonly since: Date | null };

/** What between the team and owners waits for a person in a scheme. */
export type OwnersWaiting = {
  readonly schemeId: string;
  /** Batches of letters that somebody else prepared and that wait for a check. */
  readonly toCheck: Counted;
  /** Batches of their own that were returned. */
  readonly returned: Counted;
  /** Batches that were checked and can be sent. */
  readonly toSend: Counted;
  /** Open matters that are theirs or nobody's, and how many of them are past the day that was promised. */
  readonly matters: Counted & { readonly late: number };
  /** Appointments for which another day is asked for. */
  readonly appointments: Counted;
  /** Undertakings that are not done after their day. */
  readonly undertakings: Counted;
};

type Row = {
  readonly schemeId: string;
  readonly toCheck: number;
  readonly toCheckSince: Date | null;
  readonly toSend: number;
  readonly toSendSince: Date | null;
  readonly returned: number;
  readonly returnedSince: Date | null;
  readonly matters: number;
  readonly late: number;
  readonly mattersSince: Date | null;
  readonly appointments: number;
  readonly appointmentsSince: Date | null;
  readonly undertakings: number;
  readonly undertakingsSince: Date | null;
};

const TO_CHECK = `state = 'waiting for check' and prepared_by <> $2`;
/** Until another batch of the kind has been prepared in its stead. */
const RETURNED = `state = 'returned' and prepared_by = $2 and not exists (
  select from letter_batches n
  where n.scheme_id = b.scheme_id and n.kind = b.kind and n.number > b.number)`;

/** What between the team and owners waits for a person in some schemes. */
export async function findOwnersWaiting(
  database: Sequelize,
  schemeIds: readonly string[],
  personId: string,
): Promise<OwnersWaiting[]> {
  const rows = await database.query<Row>(
    `select s.id as "schemeId", l.*, m.*, a.*, u.*
     from unnest($1::uuid[]) as s (id)
     cross join lateral (
       select (count(*) filter (where ${TO_CHECK}))::integer as "toCheck",
         min(prepared_at) filter (where ${TO_CHECK}) as "toCheckSince",
         (count(*) filter (where state = 'checked'))::integer as "toSend",
         min(checked_at) filter (where state = 'checked') as "toSendSince",
         (count(*) filter (where ${RETURNED}))::integer as returned,
         min(checked_at) filter (where ${RETURNED}) as "returnedSince"
       from letter_batches b where scheme_id = s.id
     ) l
     cross join lateral (
       select count(*)::integer as matters, min(changed_at) as "mattersSince",
         (count(*) filter (where due < current_date))::integer as late
       from matters
       where scheme_id = s.id and state = 'open' and coalesce(assigned_to = $2, true)
     ) m
     cross join lateral (
       select count(*)::integer as appointments, min(changed_at) as "appointmentsSince"
       from appointments where scheme_id = s.id and state = 'another day asked for'
     ) a
     cross join lateral (
       select count(*)::integer as undertakings, min(due)::timestamptz as "undertakingsSince"
       from undertakings where scheme_id = s.id and done_on is null and due < current_date
     ) u`,
    { type: QueryTypes.SELECT, bind: [schemeIds, personId] },
  );
  return rows.map((row) => ({
    schemeId: row.schemeId,
    toCheck: { count: row.toCheck, since: row.toCheckSince },
    toSend: { count: row.toSend, since: row.toSendSince },
    returned: { count: row.returned, since: row.returnedSince },
    matters: { count: row.matters, since: row.mattersSince, late: row.late },
    appointments: { count: row.appointments, since: row.appointmentsSince },
    undertakings: { count: row.undertakings, since: row.undertakingsSince },
  }));
}
