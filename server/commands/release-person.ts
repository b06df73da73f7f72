import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { Membership } from '../models/membership.ts';
import { Person } from '../models/person.ts';
import { endLinks } from './end-links.ts';

/**
 * Unties the people who sign in for parties. Who signs in for no other party of the scheme is no owner in
 * it any more; their sessions and unused links end. Who that is.
 */
export async function releasePeople(
  database: Sequelize,
  schemeId: string,
  partyIds: readonly string[],
  transaction: Transaction,
): Promise<string[]> {
  const tied = await database.query<{ id: string; isOwnerStill: boolean }>(
    `with freed as (
       select distinct person_id as id from parties
       where scheme_id = $1 and id = any($2::uuid[]) and person_id is not null
     )
     select id, exists (
       select from parties o where o.scheme_id = $1 and o.person_id = freed.id
         and o.id <> all($2::uuid[]) and o.merged_into is null and o.erased_at is null
     ) as "isOwnerStill" from freed`,
    { type: QueryTypes.SELECT, bind: [schemeId, partyIds], transaction },
  );
  await database.query('update parties set person_id = null where id = any($1::uuid[])', {
    bind: [partyIds],
    transaction,
  });
  const released = tied.filter(({ isOwnerStill }) => !isOwnerStill).map(({ id }) => id);
  for (const personId of released) {
    await Membership.destroy({ where: { schemeId, personId, role: 'owner' }, transaction });
    await Person.update(
      { sessionsValidFrom: new Date() },
      { where: { id: personId }, transaction },
    );
    await endLinks(personId, transaction);
  }
  return released;
}
