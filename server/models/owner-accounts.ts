import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** Somebody who signs in for a party. */
export type OwnerAccount = {
  readonly partyId: string;
  readonly personId: string;
  /** Whether they have a password, and so need no link that sets one. */
  readonly canSignIn: boolean;
};

/**
 * Makes those people who are not there yet who are to sign in for some parties of a scheme, by their e-mail
 * addresses, and gives them their part in it as owners; gives everybody who signs in for one of the parties.
 */
export async function makeOwnerAccounts(
  database: Sequelize,
  schemeId: string,
  partyIds: readonly string[],
  transaction: Transaction,
): Promise<OwnerAccount[]> {
  const bind = [schemeId, partyIds];
  const meant = `p.scheme_id = $1 and p.id = any($2::uuid[]) and p.email is not null`;
  await database.query(
    `insert into people (id, email, name)
     select gen_random_uuid(), email, name from (
       select distinct on (lower(p.email)) p.email, p.name from parties p
       where ${meant} and p.person_id is null
         and not exists (select from people q where lower(q.email) = lower(p.email))
       order by lower(p.email), p.created_at
     ) as new`,
    { bind, transaction },
  );
  await database.query(
    `update parties p set person_id = q.id from people q
     where ${meant} and p.person_id is null and lower(q.email) = lower(p.email)`,
    { bind, transaction },
  );
  await database.query(
    `insert into memberships (scheme_id, person_id, role)
     select distinct $1::uuid, p.person_id, 'owner' from parties p where ${meant}
     on conflict do nothing`,
    { bind, transaction },
  );
  return database.query<OwnerAccount>(
    `select p.id as "partyId", q.id as "personId", q.password_hash is not null as "canSignIn"
     from parties p join people q on q.id = p.person_id where ${meant}`,
    { type: QueryTypes.SELECT, bind, transaction },
  );
}
