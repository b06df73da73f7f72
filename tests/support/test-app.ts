import type { Express } from 'express';
import pg from 'pg';
import type { DestinationStream } from 'pino';
import { afterAll, beforeAll } from 'vitest';
import { createApp } from '../../server/app.ts';
import { connectDatabase } from '../../server/database/connect.ts';
import { readEnv } from '../../server/env.ts';
import { createLogger } from '../../server/logger.ts';
import type { Letter } from '../../server/mail/mailer.ts';
import type { Services } from '../../server/services.ts';
import { createTileCache } from '../../server/tiles/tile-cache.ts';
import { createTestDatabase } from './test-database.ts';

export type TestApp = {
  readonly app: () => Express;
  readonly services: () => Services;
  /** What was sent, oldest first. */
  readonly letters: Letter[];
};

/** The application on a database of its own for the tests of one file; `env` and `log` override. */
export function testApp({
  env: overrides = {},
  log,
}: {
  readonly env?: Readonly<Record<string, string>>;
  /** Where the log goes; nowhere else. */
  readonly log?: DestinationStream;
} = {}): TestApp {
  const letters: Letter[] = [];
  let running: { app: Express; services: Services } | undefined;
  let close: (() => Promise<void>) | undefined;

  beforeAll(async () => {
    const copy = await createTestDatabase();
    const env = readEnv({
      NODE_ENV: 'test',
      DATABASE_URL: copy.serverUrl,
      SESSION_SECRET: 'a secret of thirty-two letters or more',
      PUBLIC_URL: 'http://127.0.0.1:4600',
      DEMO: 'true',
      LOG_LEVEL: 'silent',
      ...overrides,
    });
    const database = connectDatabase(env.DATABASE_URL);
    const pool = new pg.Pool({ connectionString: env.DATABASE_URL, max: 3 });
    const mailer = {
      send: (letter: Letter) => {
        letters.push(letter);
        return Promise.resolve();
      },
    };
    const services = {
      env,
      database,
      mailer,
      logger: createLogger(env, log),
      tiles: createTileCache(),
    };
    running = { services, app: createApp(services, pool, process.cwd()) };
    close = async () => {
      await database.close();
      await pool.end();
      await copy.drop();
    };
  });

  afterAll(async () => {
    await close?.();
  });

  function started() {
    if (running === undefined) throw new Error('The application has not started yet.');
    return running;
  }
  return { app: () => started().app, services: () => started().services, letters };
}
