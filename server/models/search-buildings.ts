import { QueryTypes, type Sequelize } from 'sequelize';

export type FoundBuilding = {
  readonly id: number;
  readonly reference: string;
  readonly name: string | null;
  readonly address: string | null;
  readonly west: number;
  readonly south: number;
  readonly east: number;
  readonly north: number;
};

/** Of so many that fit, the best are good enough: whoever searches types another letter. */
const ENOUGH = 2000;

/** Buildings in whose reference, name or address every word of a search begins a word; references first. */
export async function searchBuildings(
  database: Sequelize,
  schemeId: string,
  { search, limit }: { readonly search: string; readonly limit: number },
): Promise<FoundBuilding[]> {
  return database.query<FoundBuilding>(
    `with wanted as (
       select string_agg('''' || word || ''':*', ' & ')::tsquery as query
       from unnest(tsvector_to_array(folded_words($2))) as word
     ), enough as (
       select id, reference, name, address, west, south, east, north
       from buildings, wanted
       where scheme_id = $1 and removed_at is null and words @@ query
       limit ${ENOUGH}
     )
     select * from enough
     order by lower(reference) = lower($2) desc,
       starts_with(lower(reference), lower($2)) desc,
       starts_with(lower(name), lower($2)) is true desc,
       reference
     limit $3`,
    { type: QueryTypes.SELECT, bind: [schemeId, search, limit] },
  );
}
