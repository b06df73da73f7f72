import pg from 'pg';
import { connectDatabase } from './database/connect.ts';
import type { Env } from './env.ts';
import { openBoss } from './jobs/open-boss.ts';
import { openJobs } from './jobs/open-jobs.ts';
import { createLogger } from './logger.ts';
import { openMail } from './mail/open-mail.ts';
import { openOutbox } from './mail/open-outbox.ts';
import { openRunQueue } from './runs/open-run-queue.ts';
import type { Services } from './services.ts';
import { createTileCache } from './tiles/tile-cache.ts';

export type OpenServices = {
  readonly services: Services;
  /** Holds the sessions. */
  readonly pool: pg.Pool;
  readonly closeServices: () => Promise<void>;
};

/** Opens what the application works with, and gives the way to close it. */
export async function openServices(env: Env): Promise<OpenServices> {
  const logger = createLogger(env);
  const database = connectDatabase(env.DATABASE_URL);
  const pool = new pg.Pool({ connectionString: env.DATABASE_URL, max: 5 });
  // an idle connection that breaks is replaced at the next request; unheard, it would end the process
  pool.on('error', (error) => {
    logger.error({ err: error }, 'a connection for sessions broke');
  });
  const jobs = openJobs({ env, logger, database });
  const queues = await openBoss({ env, logger, database });
  const runs = await openRunQueue({ logger, database, queues });
  const mail = await openMail(env, logger);
  const tools = { env, logger, database, mailer: mail.mailer, runs };
  const outbox = await openOutbox({ ...tools, queues });
  return {
    services: { ...tools, outbox, tiles: createTileCache(), jobs },
    pool,
    closeServices: async () => {
      await Promise.all([jobs.close(), queues.close()]);
      await runs.close();
      await Promise.all([mail.close(), database.close(), pool.end()]);
    },
  };
}
