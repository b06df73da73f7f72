import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { InterestValues, PartyValues } from '../../shared/schemas/parties.ts';

type Fields = Omit<PartyValues, 'interests'>;

export type NewParty = Fields & { readonly id: string };

export type NewInterest = InterestValues & { readonly id: string; readonly partyId: string };

function asRow({ address, ...others }: NewParty): object {
  return { ...others, address: address.join('\n') };
}

/** Keeps new parties; whoever represents them may be among them. */
export async function insertParties(
  database: Sequelize,
  schemeId: string,
  parties: readonly NewParty[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into parties (id, scheme_id, kind, name, address, email, channel, represented_by)
     select id, $1, kind, name, address, email, channel, "representedBy"
     from jsonb_to_recordset($2::jsonb) as given(id uuid, kind text, name text, address text,
       email text, channel text, "representedBy" uuid)`,
    { bind: [schemeId, JSON.stringify(parties.map(asRow))], transaction },
  );
}

/** Keeps interests of parties. */
export async function insertInterests(
  database: Sequelize,
  interests: readonly NewInterest[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `insert into interests (id, party_id, building_id, kind, from_day, to_day)
     select id, "partyId", "buildingId", kind, "from", "to"
     from jsonb_to_recordset($1::jsonb) as given(id uuid, "partyId" uuid, "buildingId" integer,
       kind text, "from" date, "to" date)`,
    { bind: [JSON.stringify(interests)], transaction },
  );
}

/** Writes what a party is called and how it is reached anew, as its next version. */
export async function updateParty(
  database: Sequelize,
  id: string,
  fields: Fields,
  transaction: Transaction,
): Promise<void> {
  const { kind, name, address, email, channel, representedBy } = fields;
  await database.query(
    `update parties set kind = $2, name = $3, address = $4, email = $5, channel = $6,
       represented_by = $7, version = version + 1, changed_at = now() where id = $1`,
    { bind: [id, kind, name, address.join('\n'), email, channel, representedBy], transaction },
  );
}

/** Takes interests away by their ids. */
export async function deleteInterests(
  database: Sequelize,
  ids: readonly string[],
  transaction: Transaction,
): Promise<void> {
  await database.query('delete from interests where id = any($1::uuid[])', {
    bind: [ids],
    transaction,
  });
}

/** Keeps other changes from parties of a scheme until the transaction ends. */
export async function lockParties(
  database: Sequelize,
  schemeId: string,
  ids: readonly string[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `select id from parties where scheme_id = $1 and id = any($2::uuid[]) order by id for update`,
    { type: QueryTypes.SELECT, bind: [schemeId, ids], transaction },
  );
}

/** Gives parties what they lacked; what they have stays. */
export async function completeParties(
  database: Sequelize,
  parties: readonly Pick<NewParty, 'id' | 'email' | 'representedBy'>[],
  transaction: Transaction,
): Promise<void> {
  await database.query(
    `update parties p set email = coalesce(p.email, given.email), version = version + 1,
       represented_by = coalesce(p.represented_by, given."representedBy"), changed_at = now()
     from jsonb_to_recordset($1::jsonb) as given(id uuid, email text, "representedBy" uuid)
     where p.id = given.id`,
    { bind: [JSON.stringify(parties)], transaction },
  );
}
