import { QueryTypes, type Sequelize } from 'sequelize';
import { inBatches } from '../register/in-batches.ts';
import { findPartyIds, type WhichParties } from './parties.ts';

/** An interest with its party, as a table has it; a party without interests has a line too. */
export type PartyRow = Readonly<
  Record<'name' | 'kind' | 'address' | 'channel', string> &
    Record<
      'reference' | 'buildingAddress' | 'interest' | 'email' | 'representedBy' | 'from' | 'to',
      string | null
    >
>;

const AT_ONCE = 500;

/** The parties that are asked for, a line an interest, some parties at a time. */
export async function* findPartyRows(
  database: Sequelize,
  schemeId: string,
  which: WhichParties,
): AsyncGenerator<PartyRow> {
  const { ids } = await findPartyIds(database, schemeId, { ...which, offset: 0, limit: null });
  for await (const some of inBatches(ids, AT_ONCE)) {
    yield* await database.query<PartyRow>(
      `select b.reference, b.address as "buildingAddress", i.kind as interest, p.name, p.kind, p.address,
         p.email, p.channel, r.name as "representedBy", i.from_day::text as "from", i.to_day::text as "to"
       from unnest($1::uuid[]) with ordinality as wanted(id, place)
       join parties p on p.id = wanted.id left join parties r on r.id = p.represented_by
       left join interests i on i.party_id = p.id left join buildings b on b.id = i.building_id
       order by wanted.place, b.reference collate natural_order, i.from_day, i.id`,
      { type: QueryTypes.SELECT, bind: [some] },
    );
  }
}

/** Reference and address of every building in a register, in its order. */
export function findFormRows(
  database: Sequelize,
  schemeId: string,
): Promise<{ readonly reference: string; readonly buildingAddress: string | null }[]> {
  return database.query(
    `select reference, address as "buildingAddress" from buildings
     where scheme_id = $1 and removed_at is null order by reference collate natural_order`,
    { type: QueryTypes.SELECT, bind: [schemeId] },
  );
}
