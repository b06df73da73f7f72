import { QueryTypes, type Sequelize } from 'sequelize';
import { FIELD_SELECTION } from './building-columns.ts';
import type { FootprintRings } from './building-footprint.ts';
import type { KeptBuilding } from './building-state.ts';

/** A building as an import compares with it. */
export type KnownBuilding = Omit<KeptBuilding, 'isRemoved'> & {
  /** Null where footprints are not compared. */
  readonly footprint: FootprintRings | null;
};

/** The buildings of a scheme by their references. */
export async function findKnownBuildings(
  database: Sequelize,
  schemeId: string,
  references: readonly string[],
  { withFootprints }: { readonly withFootprints: boolean },
): Promise<Map<string, KnownBuilding>> {
  const rows = await database.query<KnownBuilding>(
    `select id, version, reference, ${FIELD_SELECTION}, ground_level_from as "groundLevelFrom",
       imported, area, west, south, east, north,
       ${withFootprints ? 'footprint' : 'null as footprint'}
     from buildings ${withFootprints ? 'join building_footprints on building_id = id' : ''}
     where scheme_id = $1 and removed_at is null and reference = any($2)`,
    { type: QueryTypes.SELECT, bind: [schemeId, references] },
  );
  return new Map(rows.map((row) => [row.reference, row]));
}

/** How a building left the register by somebody's hand. */
export type RemovedBuilding = {
  readonly reference: string;
  readonly at: Date;
  /** The reference of the building that it was joined into. */
  readonly joinedInto: string | null;
};

/** The buildings that somebody took out of a scheme's register or joined into others, by their references. */
export async function findRemovedBuildings(
  database: Sequelize,
  schemeId: string,
  references: readonly string[],
): Promise<Map<string, RemovedBuilding>> {
  const rows = await database.query<RemovedBuilding>(
    `select distinct on (gone.reference) gone.reference, change.at,
       (select stays.reference from building_changes other
          join buildings stays on stays.id = other.building_id
        where other.change_id = change.id and other.after is not null limit 1) as "joinedInto"
     from buildings gone
       join building_changes own on own.building_id = gone.id and own.version = gone.version
       join register_changes change on change.id = own.change_id and change.kind in ('remove', 'join')
     where gone.scheme_id = $1 and gone.removed_at is not null and gone.reference = any($2)
     order by gone.reference, change.at desc`,
    { type: QueryTypes.SELECT, bind: [schemeId, references] },
  );
  return new Map(rows.map((row) => [row.reference, row]));
}

/** Every reference of a scheme's register with the hash of the footprint that a file gave it. */
export async function findTakenReferences(
  database: Sequelize,
  schemeId: string,
): Promise<{ reference: string; hash: string | null }[]> {
  return database.query(
    `select reference, imported->>'footprint' as hash from buildings
     where scheme_id = $1 and removed_at is null`,
    { type: QueryTypes.SELECT, bind: [schemeId] },
  );
}
