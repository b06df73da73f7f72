import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { BuildingChange } from './building-changes.ts';
import type { RegisterChangeKind } from './register-change.ts';

/** An entry of a building's history, with who made the change. */
export type HistoryEntry = BuildingChange & {
  readonly changeId: string;
  readonly at: Date;
  readonly personId: string | null;
  readonly by: string | null;
  readonly kind: RegisterChangeKind;
  readonly source: string | null;
  readonly isUndone: boolean;
  /** How often over a change was undone and done again: the undoing of another is 1, of that one 2. */
  readonly undoings: number;
  /** Whether none of the buildings of the change was changed since. */
  readonly isNewest: boolean;
};

const MOST = 200;

/** The history of a building, the newest first. */
export async function findHistory(
  database: Sequelize,
  buildingId: number,
): Promise<HistoryEntry[]> {
  return database.query<HistoryEntry>(
    `select own.building_id as "buildingId", own.version, own.before, own.after,
       change.id as "changeId", change.at, change.kind, change.source,
       change.person_id as "personId", person.name as by,
       exists (select from register_changes u where u.undoes = change.id) as "isUndone",
       (with recursive chain as (
          select change.undoes, 0 as depth
          union all
          select r.undoes, chain.depth + 1 from chain join register_changes r on r.id = chain.undoes
        ) select max(depth) from chain) as undoings,
       own.version = building.version and not exists (
         select from building_changes c join buildings b on b.id = c.building_id
         where c.change_id = change.id and b.version <> c.version
       ) as "isNewest"
     from building_changes own
       join buildings building on building.id = own.building_id
       join register_changes change on change.id = own.change_id
       left join people person on person.id = change.person_id
     where own.building_id = $1
     order by own.version desc
     limit ${MOST}`,
    { type: QueryTypes.SELECT, bind: [buildingId] },
  );
}

/** What a change did, building by building, from a number on and so many of them. */
export async function findBuildingChanges(
  database: Sequelize,
  changeId: string,
  { after, limit }: { readonly after: number; readonly limit: number },
  transaction: Transaction,
): Promise<BuildingChange[]> {
  return database.query<BuildingChange>(
    `select building_id as "buildingId", version, before, after
     from building_changes where change_id = $1 and building_id > $2
     order by building_id limit $3`,
    { type: QueryTypes.SELECT, bind: [changeId, after, limit], transaction },
  );
}
