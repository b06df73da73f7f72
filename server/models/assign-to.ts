import type { Sequelize, Transaction } from 'sequelize';

/** Gives some buildings to a person, or to nobody. */
export async function assignTo(
  database: Sequelize,
  ids: readonly number[],
  { personId, by }: { readonly personId: string | null; readonly by: string },
  transaction: Transaction,
): Promise<void> {
  if (personId === null) {
    await database.query('delete from building_assignments where building_id = any($1)', {
      bind: [ids],
      transaction,
    });
    return;
  }
  await database.query(
    `insert into building_assignments (building_id, person_id, given_by)
     select id, $2, $3 from unnest($1::integer[]) as id
     on conflict (building_id) do update
       set person_id = excluded.person_id, given_by = excluded.given_by, given_at = now()`,
    { bind: [ids, personId, by], transaction },
  );
}
