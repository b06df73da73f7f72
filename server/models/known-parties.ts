import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { ListedBefore } from '../parties/known-party.ts';
import type { KnownBefore } from '../parties/plan-import.ts';
import type { KnownBuilding } from '../parties/find-building-of-row.ts';

/** What an import of parties is held against: the buildings of a register, and all parties that are named. */
export async function findKnownParties(
  database: Sequelize,
  schemeId: string,
  transaction: Transaction | null,
): Promise<KnownBefore> {
  const bind = [schemeId];
  const type = QueryTypes.SELECT as const;
  const buildings = await database.query<KnownBuilding>(
    'select id, reference, address from buildings where scheme_id = $1 and removed_at is null order by id',
    { type, bind, transaction },
  );
  const parties = await database.query<ListedBefore>(
    `select p.id, p.name, p.address, p.email, p.represented_by as "representedBy",
       p.merged_into as "mergedInto", coalesce((
         select json_agg(json_build_object('buildingId', building_id, 'kind', kind,
           'from', from_day, 'to', to_day))
         from interests i where i.party_id = p.id), '[]') as interests
     from parties p where p.scheme_id = $1 and p.erased_at is null
     order by p.merged_into is not null, p.created_at, p.id`,
    { type, bind, transaction },
  );
  return { buildings, parties };
}
