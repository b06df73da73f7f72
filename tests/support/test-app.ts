import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, type Server } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import pg from 'pg';
import type { DestinationStream } from 'pino';
import { afterAll, beforeAll } from 'vitest';
import { createApp } from '../../server/app.ts';
import { connectDatabase } from '../../server/database/connect.ts';
import { readEnv } from '../../server/env.ts';
import { openJobs, openJobsInline } from '../../server/jobs/open-jobs.ts';
import { createLogger } from '../../server/logger.ts';
import type { Letter } from '../../server/mail/mailer.ts';
import { inlineOutbox, type InlineOutbox } from './inline-outbox.ts';
import { inlineRunQueue, type InlineRunQueue } from './inline-run-queue.ts';
import type { Services } from '../../server/services.ts';
import { createTileCache } from '../../server/tiles/tile-cache.ts';
import { createTestDatabase } from './test-database.ts';

export type TestApp = {
  /** Listening, so that a request need not open and close a port. */
  readonly app: () => Server;
  readonly services: () => Services;
  /** Steps of runs are done in it at once. */
  readonly runQueue: () => InlineRunQueue;
  /** Mails that are put into it are sent at once. */
  readonly outbox: () => InlineOutbox;
  /** What was sent, oldest first. */
  readonly letters: Letter[];
};

/** The application on a database of its own for the tests of one file; others override. */
export function testApp({
  env: overrides = {},
  log,
  root = process.cwd(),
  threads = false,
}: {
  readonly env?: Readonly<Record<string, string>>;
  /** Where the log goes; nowhere else. */
  readonly log?: DestinationStream;
  /** Where the built client is. */
  readonly root?: string;
  /** Jobs in threads of their own, as they are in earnest. */
  readonly threads?: boolean;
} = {}): TestApp {
  const letters: Letter[] = [];
  let running:
    { app: Server; services: Services; queue: InlineRunQueue; outbox: InlineOutbox } | undefined;
  let close: (() => Promise<void>) | undefined;

  beforeAll(async () => {
    const copy = await createTestDatabase();
    const uploads = await mkdtemp(path.join(tmpdir(), 'groundsill-uploads-'));
    const photographs = await mkdtemp(path.join(tmpdir(), 'groundsill-photographs-'));
    const prints = await mkdtemp(path.join(tmpdir(), 'groundsill-prints-'));
    const env = readEnv({
      NODE_ENV: 'test',
      DATABASE_URL: copy.serverUrl,
      SESSION_SECRET: 'a secret of thirty-two letters or more',
      PUBLIC_URL: 'http://127.0.0.1:4600',
      DEMO: 'true',
      LOG_LEVEL: 'silent',
      UPLOADS_FOLDER: uploads,
      PHOTOGRAPHS_FOLDER: photographs,
      PRINTS_FOLDER: prints,
      ...overrides,
    });
    const database = connectDatabase(env.DATABASE_URL);
    const pool = new pg.Pool({ connectionString: env.DATABASE_URL, max: 3 });
    // a connection may hear that its database is dropped before it is closed
    pool.on('error', () => undefined);
    const mailer = {
      send: (letter: Letter) => {
        letters.push(letter);
        return Promise.resolve('250 taken in');
      },
    };
    const tools = {
      env,
      database,
      mailer,
      logger: createLogger(env, log),
      tiles: createTileCache(),
    };
    const jobs = threads ? openJobs(tools) : openJobsInline(tools);
    const queue = inlineRunQueue(database);
    const outbox = inlineOutbox({ ...tools, runs: queue });
    const services = { ...tools, jobs, runs: queue, outbox };
    const app = createServer(createApp(services, pool, root)).listen(0, '127.0.0.1');
    await once(app, 'listening');
    running = { services, queue, outbox, app };
    close = async () => {
      app.close();
      app.closeAllConnections();
      await jobs.close();
      await queue.close();
      await outbox.idle();
      await database.close();
      await pool.end();
      await copy.drop();
      await rm(uploads, { recursive: true });
      await rm(photographs, { recursive: true });
      await rm(prints, { recursive: true });
    };
  });

  afterAll(async () => {
    await close?.();
  });

  function started() {
    if (running === undefined) throw new Error('The application has not started yet.');
    return running;
  }
  return {
    app: () => started().app,
    services: () => started().services,
    runQueue: () => started().queue,
    outbox: () => started().outbox,
    letters,
  };
}
