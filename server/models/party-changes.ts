import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** What was done with a party: what it was before, and what after. */
export type PartyChange = {
  readonly partyId: string;
  readonly action: 'added' | 'changed' | 'merged' | 'imported' | 'erased';
  readonly before: object | null;
  readonly after: object | null;
};

export type FoundPartyChange = Omit<PartyChange, 'partyId'> & {
  readonly at: Date;
  readonly by: string | null;
};

/** Writes changes of parties to their histories. */
export async function insertPartyChanges(
  database: Sequelize,
  by: string | null,
  changes: readonly PartyChange[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into party_changes (party_id, changed_by, action, before, after)
     select "partyId", $1, action, nullif(before, 'null'), nullif(after, 'null')
     from jsonb_to_recordset($2::jsonb) as given("partyId" uuid, action text, before jsonb, after jsonb)`,
    { bind: [by, JSON.stringify(changes)], transaction },
  );
}

/** What was done with parties, the newest first. */
export function findPartyChanges(
  database: Sequelize,
  partyIds: readonly string[],
): Promise<FoundPartyChange[]> {
  return database.query<FoundPartyChange>(
    `select c.changed_at as at, p.name as by, c.action, c.before, c.after
     from party_changes c left join people p on p.id = c.changed_by
     where c.party_id = any($1::uuid[]) order by c.id desc`,
    { type: QueryTypes.SELECT, bind: [partyIds] },
  );
}
