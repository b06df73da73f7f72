import { setTimeout as sleep } from 'node:timers/promises';
import type { Response } from 'express';
import type { Sequelize } from 'sequelize';
import { isUnderWay } from '../../shared/schemas/runs.ts';
import { findProgress } from '../models/run-chunks.ts';

/** In milliseconds. */
const LOOK_EVERY = 400;

/** Who still listens then asks again, and is asked who they are. */
const LONGEST = 600_000;

/** Answers with events that tell how far a run is, until it has ended or nobody listens. */
export async function followRun(database: Sequelize, runId: string, res: Response): Promise<void> {
  const left = new AbortController();
  res.once('close', () => {
    left.abort();
  });
  res.set({ 'Content-Type': 'text/event-stream', 'X-Accel-Buffering': 'no' });
  res.flushHeaders();
  const until = performance.now() + LONGEST;
  let told = '';
  while (!left.signal.aborted && performance.now() < until) {
    const progress = await findProgress(database, runId);
    const data = JSON.stringify(progress);
    if (data !== told) res.write(`data: ${data}\n\n`);
    told = data;
    if (progress === undefined || !isUnderWay(progress.state)) break;
    await sleep(LOOK_EVERY, undefined, { signal: left.signal }).catch(() => undefined);
  }
  res.end();
}
