import { setTimeout as sleep } from 'node:timers/promises';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Sequelize } from 'sequelize';
import { recoverRuns } from '../../../server/commands/recover-runs.ts';
import { startRun } from '../../../server/commands/start-run.ts';
import { connectDatabase } from '../../../server/database/connect.ts';
import { openBoss, type Boss } from '../../../server/jobs/open-boss.ts';
import { createLogger } from '../../../server/logger.ts';
import { findProgress } from '../../../server/models/run-chunks.ts';
import { RunState } from '../../../server/models/run-state.ts';
import { Run } from '../../../server/models/run.ts';
import { openRunQueue } from '../../../server/runs/open-run-queue.ts';
import type { RunQueue } from '../../../server/runs/run-queue.ts';
import { aTownToRun } from '../../support/runs.ts';
import { createTestDatabase } from '../../support/test-database.ts';

const logger = createLogger({ LOG_LEVEL: 'silent' });
let copy: Awaited<ReturnType<typeof createTestDatabase>>;
let database: Sequelize;
let queues: Boss;
let queue: RunQueue;

beforeAll(async () => {
  copy = await createTestDatabase();
  database = connectDatabase(copy.serverUrl);
  queues = await openBoss({ env: { DATABASE_URL: copy.serverUrl }, database, logger });
  queue = await openRunQueue({ database, logger, queues });
});

afterAll(async () => {
  await queues.close();
  await queue.close();
  await database.close();
  await copy.drop();
});

async function ended(runId: string): Promise<RunState> {
  for (;;) {
    const state = await RunState.findByPk(runId, { rejectOnEmpty: true });
    if (state.state !== 'planning' && state.state !== 'running') return state;
    await sleep(50);
  }
}

/** A run of which no step was sent, as where a process died over it. */
async function aLostRun() {
  const { scheme, option } = await aTownToRun();
  const lost = { send: () => Promise.resolve() };
  const runs = { ...queue, ...lost };
  const asked = { alignmentId: option.id, alignmentVersion: 1 };
  return { scheme, run: await startRun({ database, runs }, null, scheme, asked) };
}

test('a run goes over the queue of the database and through threads to its end', async () => {
  const { scheme, option } = await aTownToRun();
  const asked = { alignmentId: option.id, alignmentVersion: 1 };
  const { id } = await startRun({ database, runs: queue }, null, scheme, asked);
  expect(await ended(id)).toMatchObject({ state: 'complete', fault: null });
  expect(await findProgress(database, id)).toMatchObject({ done: 23, buildings: 23 });
});

test('a run that a dead process had in hand goes on at the next start', async () => {
  const { run } = await aLostRun();
  await recoverRuns({ database, runs: queue, logger });
  expect(await ended(run.id)).toMatchObject({ state: 'complete' });
});

test('a run begun by another version of the method ends, since its figures would not agree', async () => {
  const { scheme, run } = await aLostRun();
  const older = await Run.create({
    ...run.get({ plain: true }),
    id: crypto.randomUUID(),
    number: 2,
    methodVersion: '0.9.0',
  });
  await RunState.create({ runId: older.id, state: 'running' });
  await recoverRuns({ database, runs: queue, logger });
  expect(await ended(older.id)).toMatchObject({ state: 'failed' });
  expect(await ended(run.id)).toMatchObject({ state: 'complete' });
  expect(scheme.id).toBe(older.schemeId);
});
