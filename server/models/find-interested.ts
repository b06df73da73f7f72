import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';

/** Somebody with an interest in a building today, and whom letters to them go to. */
export type Interested = {
  readonly partyId: string;
  readonly name: string;
  readonly address: string;
  readonly email: string | null;
  readonly channel: 'e-mail' | 'post';
  readonly personId: string | null;
  /** Whom they are represented by, to whom letters go in their stead. */
  readonly representative: {
    readonly id: string;
    readonly name: string;
    readonly address: string;
    readonly email: string | null;
    readonly channel: 'e-mail' | 'post';
    readonly personId: string | null;
  } | null;
  readonly buildings: readonly number[];
};

const SELECTION = `p.id as "partyId", p.name, p.address, p.email, p.channel, p.person_id as "personId",
  case when r.id is not null then json_build_object('id', r.id, 'name', r.name,
    'address', r.address, 'email', r.email, 'channel', r.channel, 'personId', r.person_id) end
    as representative`;

const FROM = `parties p
  left join parties r on r.id = p.represented_by and r.merged_into is null and r.erased_at is null`;

const LIVE = 'p.scheme_id = $1 and p.merged_into is null and p.erased_at is null';

/** Whether an interest `i` is one today. */
export const INTEREST_TODAY = `coalesce(i.from_day <= current_date, true) and coalesce(i.to_day >= current_date, true)`;

/** Everybody with an interest in one of some buildings today, by name. */
export function findInterested(
  database: Sequelize,
  schemeId: string,
  buildings: readonly number[],
  transaction: Transaction | null,
): Promise<Interested[]> {
  return database.query<Interested>(
    `select ${SELECTION}, found.buildings
     from ${FROM}
     join lateral (
       select array_agg(distinct i.building_id order by i.building_id) as buildings
       from interests i where i.party_id = p.id and i.building_id = any($2::integer[]) and ${INTEREST_TODAY}
     ) as found on found.buildings is not null
     where ${LIVE}
     order by p.name collate natural_order, p.id`,
    { type: QueryTypes.SELECT, bind: [schemeId, buildings], transaction },
  );
}

/** Some parties with all the buildings of the register that they have an interest in today. */
export function findParties(
  database: Sequelize,
  schemeId: string,
  ids: readonly string[],
  transaction: Transaction | null,
): Promise<Interested[]> {
  return database.query<Interested>(
    `select ${SELECTION}, array(
       select distinct i.building_id from interests i join buildings b on b.id = i.building_id
       where i.party_id = p.id and b.removed_at is null and ${INTEREST_TODAY} order by 1
     ) as buildings
     from ${FROM} where ${LIVE} and p.id = any($2::uuid[])
     order by p.name collate natural_order, p.id`,
    { type: QueryTypes.SELECT, bind: [schemeId, ids], transaction },
  );
}
