import pg from 'pg';
import { openMigrations } from './database/migrate.ts';
import { readMigrateEnv } from './env.ts';
import { report } from './report.ts';

/** Any number; who holds its lock migrates. */
const LOCK = 20_260_101;

/** Brings a database to the newest migration, one process at a time. */
async function migrate(): Promise<void> {
  const env = readMigrateEnv(process.env);
  const keeper = new pg.Client(env.MIGRATE_URL);
  await keeper.connect();
  await keeper.query('select pg_advisory_lock($1)', [LOCK]);
  const migrations = openMigrations(env.MIGRATE_URL, env.DATABASE_URL);
  try {
    report({ applied: await migrations.up() });
  } finally {
    await migrations.close();
    await keeper.end();
  }
}

await migrate();
