import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** What a person has in a scheme: the parties that they are or act for, and these parties' buildings. */
export type Own = {
  /** With those that were merged into them: what was written to these is theirs too. */
  readonly parties: readonly string[];
  /** Each building once; the party is the person's own where both it and one they act for are there. */
  readonly buildings: readonly { readonly id: number; readonly partyId: string }[];
};

const PARTIES = `
  select p.id, case when p.person_id = $2 then 0 else 1 end as rank
  from parties p left join parties r on r.id = p.represented_by
  where p.scheme_id = $1 and p.merged_into is null and p.erased_at is null
    and (p.person_id = $2
      or (r.person_id = $2 and r.merged_into is null and r.erased_at is null))`;

/**
 * What is a person's own in a scheme: live parties that are the person or are represented by one that is, and
 * the buildings in the register in which these have an interest today. The only way in which the owners'
 * routes find anything.
 */
export async function findOwn(
  database: Sequelize,
  schemeId: string,
  personId: string,
  transaction: Transaction | null = null,
): Promise<Own> {
  const bind = [schemeId, personId];
  const options = { type: QueryTypes.SELECT as const, bind, transaction };
  const parties = await database.query<{ id: string }>(
    `with recursive own as (
       ${PARTIES}
       union select p.id, own.rank from parties p join own on p.merged_into = own.id
     ) select id from own order by rank, id`,
    options,
  );
  const buildings = await database.query<{ id: number; partyId: string }>(
    `with own as (${PARTIES})
     select distinct on (b.id) b.id, own.id as "partyId"
     from own join interests i on i.party_id = own.id join buildings b on b.id = i.building_id
     where b.scheme_id = $1 and b.removed_at is null
       and coalesce(i.from_day <= current_date, true) and coalesce(i.to_day >= current_date, true)
     order by b.id, own.rank, own.id`,
    options,
  );
  return { parties: parties.map(({ id }) => id), buildings };
}
