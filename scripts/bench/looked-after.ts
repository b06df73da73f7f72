import { setTimeout as sleep } from 'node:timers/promises';
import { QueryTypes, type Sequelize } from 'sequelize';

/**
 * Waits until the database has counted a table that was just filled, as it does by itself within a minute or
 * two; until then it looks up by guesses.
 */
export async function untilLookedAfter(database: Sequelize, table: string): Promise<void> {
  const since = new Date();
  for (;;) {
    const [row] = await database.query<{ analyzed: boolean; vacuumed: boolean }>(
      `select last_autoanalyze > $2 as analyzed, last_autovacuum > $2 as vacuumed
       from pg_stat_user_tables where relname = $1`,
      { type: QueryTypes.SELECT, bind: [table, since] },
    );
    if (row?.analyzed === true && row.vacuumed) return;
    await sleep(1000);
  }
}
