import { connectDatabase } from './database/connect.ts';
import { readWorkerEnv } from './env.ts';
import { openBoss } from './jobs/open-boss.ts';
import { createLogger } from './logger.ts';
import { report } from './report.ts';
import { openRunQueue } from './runs/open-run-queue.ts';
import { toldToStop } from './told-to-stop.ts';

/** Works at steps of runs beside the server, on this machine or another, until told to stop. */
async function work(): Promise<void> {
  const env = readWorkerEnv(process.env);
  const logger = createLogger(env);
  const stop = toldToStop();
  const database = connectDatabase(env.DATABASE_URL);
  const queues = await openBoss({ env, database, logger });
  const queue = await openRunQueue({ database, logger, queues });
  report({ working: true });
  logger.info('working at runs');
  await stop;
  await queues.close();
  await queue.close();
  await database.close();
  if (process.connected) process.disconnect();
}

await work();
