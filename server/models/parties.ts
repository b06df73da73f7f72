import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { Party } from '../../shared/schemas/parties.ts';
import type { ListedParty } from '../../shared/schemas/party-answers.ts';

/** A party as its presenter wants it, the lines of its address in one text. */
export type FoundParty = Omit<Party, 'address' | 'erasedAt'> & {
  readonly address: string;
  readonly erasedAt: Date | null;
};

export type FoundListedParty = FoundParty & Pick<ListedParty, 'interestCount'>;

/** So many interests stand in a list. */
const NAMED = 3;

const INTERESTS = `select i.id, i.kind, i.from_day, i.to_day, b.id as building_id, b.reference, b.address
  from interests i join buildings b on b.id = i.building_id where i.party_id = p.id`;

/** What is read of a party, with the first of its interests by an order. */
function columns(order: string, limit: number | 'all'): string {
  return `p.id, p.kind, p.name, p.address, p.email, p.channel, p.version,
    p.merged_into as "mergedInto", p.erased_at as "erasedAt",
    (select json_build_object('id', r.id, 'name', r.name) from parties r where r.id = p.represented_by)
      as "representedBy",
    (select json_build_object('name', s.name, 'email', s.email) from people s where s.id = p.person_id)
      as person,
    coalesce((
      select json_agg(json_build_object('id', id, 'kind', kind, 'from', from_day, 'to', to_day,
        'building', json_build_object('id', building_id, 'reference', reference, 'address', address)))
      from (${INTERESTS} order by ${order}b.reference collate natural_order, i.from_day nulls first, i.id
        limit ${limit}) as first
    ), '[]') as interests`;
}

/** Every word that is searched has to begin a word of the party or of one of its buildings. */
const LISTED = `p.scheme_id = $1 and p.merged_into is null and p.erased_at is null
  and ($2::integer is null or exists (
    select from interests o where o.party_id = p.id and o.building_id = $2))
  and not exists (
    select from unnest(tsvector_to_array(folded_words($3))) as word
    cross join lateral (select ('''' || word || ''':*')::tsquery as one) as wanted
    where not p.words @@ one and not exists (
      select from interests o join buildings b on b.id = o.building_id
      where o.party_id = p.id and b.words @@ one))`;

export type WhichParties = { readonly search: string; readonly building?: number | undefined };

/** A page of the parties of a scheme that are neither merged nor erased, by name; and how many there are. */
export async function findParties(
  database: Sequelize,
  schemeId: string,
  { search, building, offset, limit }: WhichParties & { offset: number; limit: number },
): Promise<{ found: number; parties: FoundListedParty[] }> {
  const which = [schemeId, building ?? null, search];
  const [counted] = await database.query<{ found: number }>(
    `select count(*)::integer as found from parties p where ${LISTED}`,
    { type: QueryTypes.SELECT, bind: which },
  );
  const parties = await database.query<FoundListedParty>(
    `select ${columns('(b.id = $2) is true desc, ', NAMED)},
       (select count(*)::integer from interests i where i.party_id = p.id) as "interestCount"
     from parties p where ${LISTED}
     order by p.name collate natural_order, p.id offset $4 limit $5`,
    { type: QueryTypes.SELECT, bind: [...which, offset, limit] },
  );
  return { found: counted?.found ?? 0, parties };
}

/** Parties of a scheme by id with all of their interests, also merged and erased ones. */
export function findPartiesById(
  database: Sequelize,
  schemeId: string,
  ids: readonly string[],
  transaction: Transaction | null = null,
): Promise<FoundParty[]> {
  return database.query<FoundParty>(
    `select ${columns('', 'all')} from parties p where p.scheme_id = $1 and p.id = any($2::uuid[])`,
    { type: QueryTypes.SELECT, bind: [schemeId, ids], transaction },
  );
}

/** The parties of a scheme that were merged into one, through others too. */
export async function findMergedInto(
  database: Sequelize,
  partyId: string,
  transaction: Transaction | null = null,
): Promise<string[]> {
  const rows = await database.query<{ id: string }>(
    `with recursive followed as (
       select id from parties where merged_into = $1
       union select p.id from parties p join followed f on p.merged_into = f.id
     ) select id from followed`,
    { type: QueryTypes.SELECT, bind: [partyId], transaction },
  );
  return rows.map(({ id }) => id);
}

/** How many parties one represents. */
export async function countRepresented(
  database: Sequelize,
  partyId: string,
  transaction: Transaction,
): Promise<number> {
  const [row] = await database.query<{ count: number }>(
    'select count(*)::integer as count from parties where represented_by = $1',
    { type: QueryTypes.SELECT, bind: [partyId], transaction },
  );
  return row?.count ?? 0;
}

export type LikelyPair = {
  readonly because: 'same e-mail' | 'same name and address';
  readonly ids: readonly string[];
};

const MOST_GROUPS = 100;

/** Parties with the same e-mail address, or whose names and addresses have the same words. */
export function findLikelySame(database: Sequelize, schemeId: string): Promise<LikelyPair[]> {
  return database.query<LikelyPair>(
    `with live as (
       select id, lower(email) as email, folded_words(name)::text as name,
         folded_words(address)::text as address
       from parties where scheme_id = $1 and merged_into is null and erased_at is null
     ), alike as (
       select 'same name and address' as because, array_agg(id order by id) as ids
       from live where name <> '' group by name, address having count(*) > 1
       union all
       select 'same e-mail', array_agg(id order by id)
       from live where email is not null group by email having count(*) > 1
     )
     select distinct on (ids) because, ids from alike order by ids, because desc
     limit ${MOST_GROUPS}`,
    { type: QueryTypes.SELECT, bind: [schemeId] },
  );
}
