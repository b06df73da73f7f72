import { setTimeout as sleep } from 'node:timers/promises';
import { QueryTypes } from 'sequelize';
import { startRun } from '../../server/commands/start-run.ts';
import { readEnv } from '../../server/env.ts';
import { findMapText } from '../../server/models/run-results.ts';
import { RunState } from '../../server/models/run-state.ts';
import { Scheme } from '../../server/models/scheme.ts';
import { openServices } from '../../server/open-services.ts';
import { registerOf } from '../../server/register/register-of.ts';
import type { Services } from '../../server/services.ts';
import { RESULT_COLUMN_NAMES } from '../../shared/schemas/result-columns.ts';
import { benchDecisions } from './decisions.ts';
import { benchPrints } from './evidence.ts';
import { untilLookedAfter } from './looked-after.ts';
import { benchRecolouring } from './recolouring.ts';
import { benchPages, type NamedFilter } from './register-pages.ts';
import { townToRun } from './town-to-run.ts';

const SIZES = [2000, 20_000, 100_000] as const;
/** The size of town that plans are printed of. */
const PRINTED = 20_000;

const FOUND: readonly NamedFilter[] = [
  ['stage 3', { any: { stage: ['3'] } }],
  ['category at the high end', { any: { categoryHigh: ['2', '3'] } }],
  ['settlement', { ranges: { settlement: { from: 10 } } }],
];

function say(count: number, words: string): void {
  console.log(`run, ${count} buildings: ${words}`);
}

/** Waits for a run to end; the peak of memory is of the process with all its threads. */
async function untilEnded(runId: string): Promise<number> {
  let peak = 0;
  for (;;) {
    const { state, fault } = await RunState.findByPk(runId, { rejectOnEmpty: true });
    peak = Math.max(peak, process.memoryUsage().rss);
    if (state === 'complete') return peak;
    if (state !== 'planning' && state !== 'running') throw new Error(fault ?? state);
    await sleep(50);
  }
}

async function wallsWorkedOut(services: Services, runId: string): Promise<string> {
  const [row] = await services.database.query<{ strained: number; chunks: number }>(
    `select (select count(*) from run_results where run_id = $1 and strain is not null)::integer as strained,
       (select count(*) from run_chunks where run_id = $1)::integer as chunks`,
    { type: QueryTypes.SELECT, bind: [runId] },
  );
  // a box with a back wing has six walls
  const strained = row?.strained ?? 0;
  return `${6 * strained} walls of ${strained} buildings at the strain stage, ${row?.chunks ?? 0} parts`;
}

async function benchSize(services: Services, count: number): Promise<void> {
  const { scheme, option } = await townToRun(services.database, count);
  const asked = { alignmentId: option.id, alignmentVersion: option.version };
  for (const name of ['first', 'second']) {
    const start = performance.now();
    const { id } = await startRun(services, null, scheme, asked);
    const started = performance.now();
    const peak = await untilEnded(id);
    const [toStart, whole] = [(started - start) / 1000, (performance.now() - start) / 1000];
    const megabytes = (peak / 1e6).toFixed(0);
    say(count, `${name} ${whole.toFixed(1)} s, ${toStart.toFixed(1)} s of it taking the register down; process ${megabytes} MB`); // prettier-ignore
    if (name === 'second') continue;
    if (count === PRINTED) await benchPrints(services, scheme, id);
    say(count, await wallsWorkedOut(services, id));
    const reading = performance.now();
    const text = await findMapText(services.database, id);
    say(count, `figures for the map ${(performance.now() - reading).toFixed(0)} ms, ${(text.length / 1e6).toFixed(1)} MB before compression`); // prettier-ignore
  }
}

/** Prints what runs take from the press of the button to the last building, over the queue. */
export async function benchRuns(url: string): Promise<void> {
  const { services, pool, closeServices } = await openServices(
    readEnv({
      NODE_ENV: 'test',
      DATABASE_URL: url,
      SESSION_SECRET: 'a secret of thirty-two letters or more',
      PUBLIC_URL: 'http://127.0.0.1:4600',
      DEMO: 'true',
      LOG_LEVEL: 'error',
    }),
  );
  try {
    for (const count of SIZES) await benchSize(services, count);
    const scheme = await Scheme.findOne({ order: [['createdAt', 'desc']], rejectOnEmpty: true });
    await untilLookedAfter(services.database, 'run_results');
    const bench = { services, register: await registerOf(services, scheme) };
    await benchPages(bench, RESULT_COLUMN_NAMES, FOUND);
    await benchRecolouring({ services, pool }, scheme);
    await benchDecisions(services, scheme);
  } finally {
    await closeServices();
  }
}
