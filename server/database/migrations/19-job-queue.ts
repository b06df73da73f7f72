import PgBoss from 'pg-boss';
import type { Migration } from '../migration.ts';

/** A step that a dead process held is given to another after so long; none takes longer. */
const EXPIRES_IN_SECONDS = 30;

/** Steps of long work wait here, so that a crash loses none and other machines can take some. */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(PgBoss.getConstructionPlans());
    await sql(`
      select pgboss.create_queue('run-steps', json_build_object(
        'policy', 'standard',
        'retryLimit', 20,
        'expireInSeconds', ${EXPIRES_IN_SECONDS}
      ));
      grant usage on schema pgboss to ${server};
      grant select, insert, update, delete on all tables in schema pgboss to ${server};
    `);
  },
  down: async ({ sql }) => {
    await sql('drop schema pgboss cascade');
  },
};
