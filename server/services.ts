import type { Logger } from 'pino';
import type { Sequelize } from 'sequelize';
import type { Env } from './env.ts';
import type { Jobs } from './jobs/jobs.ts';
import type { Mailer } from './mail/mailer.ts';
import type { Outbox } from './mail/outbox.ts';
import type { RunQueue } from './runs/run-queue.ts';
import type { TileCache } from './tiles/tile-cache.ts';

/** What handlers and commands work with; made once at start, and anew in tests. */
export type Services = {
  readonly env: Env;
  readonly logger: Logger;
  readonly database: Sequelize;
  readonly mailer: Mailer;
  /** Mails that must not be lost wait in it until the mail server has them. */
  readonly outbox: Outbox;
  readonly tiles: TileCache;
  /** What is done of imports and prints beside requests. */
  readonly jobs: Jobs;
  /** Where runs are worked out, here or on another machine. */
  readonly runs: RunQueue;
};
