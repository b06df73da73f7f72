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
const LISTED = `
  with asked as (
    select ('''' || word || ''':*')::tsquery as word from unnest(tsvector_to_array(folded_words($3))) as word
  ), hits as (
    select word, p.id from asked join parties p on p.scheme_id = $1 and p.words @@ word
    union
    select word, i.party_id from asked join buildings b on b.scheme_id = $1 and b.words @@ word
    join interests i on i.building_id = b.id
  ), named as (
    select id from hits group by id having count(*) = (select count(*) from asked)
  ), listed as materialized (
    select id, name from parties p
    where scheme_id = $1 and merged_into is null and erased_at is null
      and (not exists (select from asked) or id in (select id from named))
      and ($2::integer is null or id in (select party_id from interests where building_id = $2))
  )`;

export type WhichParties = { readonly search: string; readonly building?: number | undefined };

/** Which parties of a scheme are asked for, by name; and how many there are. Null for no limit. */
export async function findPartyIds(
  database: Sequelize,
  schemeId: string,
  which: WhichParties & { readonly offset: number; readonly limit: number | null },
): Promise<{ found: number; ids: string[] }> {
  const { search, building = null, offset, limit } = which;
  const [page] = await database.query<{ found: number; ids: string[] }>(
    `${LISTED}
     select (select count(*)::integer from listed) as found,
       array(select id from listed order by name collate natural_order, id offset $4 limit $5) as ids`,
    { type: QueryTypes.SELECT, bind: [schemeId, building, search, offset, limit] },
  );
  return page ?? { found: 0, ids: [] };
}

/** A page of the parties of a scheme that are neither merged nor erased, by name; and how many there are. */
export async function findParties(
  database: Sequelize,
  schemeId: string,
  which: WhichParties & { readonly offset: number; readonly limit: number },
): Promise<{ found: number; parties: FoundListedParty[] }> {
  const { found, ids } = await findPartyIds(database, schemeId, which);
  const parties = await database.query<FoundListedParty>(
    `select ${columns('(b.id = $2::integer) is true desc, ', NAMED)},
       (select count(*)::integer from interests i where i.party_id = p.id) as "interestCount"
     from unnest($1::uuid[]) with ordinality as page(id, place) join parties p on p.id = page.id
     order by page.place`,
    { type: QueryTypes.SELECT, bind: [ids, which.building ?? null] },
  );
  return { found, parties };
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

/** The last day on which letters to an erased party are kept; null where it is not erased. */
export async function findKeptUntil(database: Sequelize, partyId: string): Promise<string | null> {
  const [erasure] = await database.query<{ keepUntil: string }>(
    'select keep_until::text as "keepUntil" from party_erasures where party_id = $1',
    { type: QueryTypes.SELECT, bind: [partyId] },
  );
  return erasure?.keepUntil ?? null;
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
