import PgBoss from 'pg-boss';
import type { Sequelize, Transaction } from 'sequelize';
import { z } from 'zod';
import type { Env } from '../env.ts';
import type { Services } from '../services.ts';

/** In seconds: how often is looked for jobs whose process died. */
const TIDY_EVERY = 5;

const STOP_WITHIN_MS = 5000;

export type Boss = {
  readonly boss: PgBoss;
  /** Puts jobs into a queue when the transaction that calls for them is committed, or not at all. */
  readonly insert: (jobs: PgBoss.JobInsert[], transaction: Transaction) => Promise<void>;
  /** Stops the work of all queues; what is in hand is finished or goes back. */
  readonly close: () => Promise<void>;
};

/** The queue's statements in a transaction of the application's. */
function within(database: Sequelize, transaction: Transaction): PgBoss.Db {
  return {
    executeSql: async (text: string, values: unknown[]) => {
      // what is left out is null in SQL, and nothing at all to the binder
      const bind = values.map((value) => value ?? null);
      const [rows] = await database.query(text, { bind, transaction });
      return { rows: z.array(z.unknown()).parse(rows) };
    },
  };
}

/** The queues as they lie in the database; nothing is made in them here. */
export async function openBoss({
  env,
  logger,
  database,
}: Pick<Services, 'database' | 'logger'> & {
  readonly env: Pick<Env, 'DATABASE_URL'>;
}): Promise<Boss> {
  const boss = new PgBoss({
    connectionString: env.DATABASE_URL,
    application_name: 'groundsill queues',
    max: 4,
    migrate: false,
    schedule: false,
    maintenanceIntervalSeconds: TIDY_EVERY,
  });
  boss.on('error', (error) => {
    logger.error({ err: error }, 'the queues in the database');
  });
  await boss.start();
  return {
    boss,
    insert: (jobs, transaction) => boss.insert(jobs, { db: within(database, transaction) }),
    close: () => boss.stop({ timeout: STOP_WITHIN_MS }),
  };
}
