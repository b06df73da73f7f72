import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { Undertaking, UndertakingValues } from '../../shared/schemas/undertakings.ts';
import { standingParty } from './standing-party.ts';

/** An undertaking as its presenter wants it; one made to a party bears the party's name of today. */
export type FoundUndertaking = Omit<Undertaking, 'changedAt' | 'madeTo'> & {
  readonly madeTo: string;
  readonly changedAt: Date;
};

const MOST = 2000;

/** The undertakings of a scheme: overdue ones first, then by day, done ones last. */
export function findUndertakings(
  database: Sequelize,
  schemeId: string,
  which: { readonly building?: number | undefined; readonly id?: string } = {},
  transaction: Transaction | null = null,
): Promise<FoundUndertaking[]> {
  return database.query<FoundUndertaking>(
    `select u.id, u.number, u.promise, coalesce(p.name, u.made_to) as "madeTo",
       u.party_id as "partyId", u.source,
       case when b.id is null then null
         else json_build_object('id', b.id, 'reference', b.reference, 'name', b.name) end as building,
       case when u.chainage_from is null then null
         else json_build_object('from', u.chainage_from, 'to', u.chainage_to) end as stretch,
       u.due::text as due, u.responsible, u.done_on::text as "doneOn", u.evidence,
       coalesce(u.done_on is null and u.due < current_date, false) as "isOverdue",
       u.version, c.name as "createdBy", u.changed_at as "changedAt"
     from undertakings u
     join people c on c.id = u.created_by
     left join lateral (${standingParty('u.party_id')}) p on true
     left join buildings b on b.id = u.building_id
     where u.scheme_id = $1
       and ($2::integer is null or u.building_id = $2)
       and ($3::uuid is null or u.id = $3)
     order by u.done_on is not null, u.done_on desc, u.due nulls last, u.number
     limit ${MOST}`,
    {
      type: QueryTypes.SELECT,
      bind: [schemeId, which.building ?? null, which.id ?? null],
      transaction,
    },
  );
}

/** The name of a party is kept with the party alone, so that erasing it erases it here. */
function bound(values: UndertakingValues): unknown[] {
  const { promise, madeTo, partyId, source, buildingId, stretch } = values;
  const { due, responsible, doneOn, evidence } = values;
  return [
    ...[promise, partyId === null ? madeTo : '', partyId, source, buildingId],
    ...[stretch?.from ?? null, stretch?.to ?? null, due, responsible, doneOn, evidence],
  ];
}

/** Keeps a new undertaking under the next number of its scheme, which is locked. */
export async function insertUndertaking(
  database: Sequelize,
  { id, schemeId, by }: { readonly id: string; readonly schemeId: string; readonly by: string },
  values: UndertakingValues,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into undertakings (id, scheme_id, number, promise, made_to, party_id, source, building_id,
       chainage_from, chainage_to, due, responsible, done_on, evidence, created_by)
     values ($1, $2, (select coalesce(max(number), 0) + 1 from undertakings where scheme_id = $2),
       $3, $4, $5, $6, $7, $8, $9, $10, $11, $12, $13, $14)`,
    { bind: [id, schemeId, ...bound(values), by], transaction },
  );
}

/** Writes an undertaking anew. */
export async function updateUndertaking(
  database: Sequelize,
  id: string,
  values: UndertakingValues,
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update undertakings set promise = $2, made_to = $3, party_id = $4, source = $5,
       building_id = $6, chainage_from = $7, chainage_to = $8, due = $9, responsible = $10,
       done_on = $11, evidence = $12, version = version + 1, changed_at = now()
     where id = $1`,
    { bind: [id, ...bound(values)], transaction },
  );
}

/** Whether a scheme has a live party of this number. */
export async function hasParty(
  database: Sequelize,
  schemeId: string,
  partyId: string,
  transaction: Transaction,
): Promise<boolean> {
  const found = await database.query(
    `select from parties
     where id = $2 and scheme_id = $1 and merged_into is null and erased_at is null`,
    { type: QueryTypes.SELECT, bind: [schemeId, partyId], transaction },
  );
  return found.length > 0;
}
