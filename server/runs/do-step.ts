import type { Sequelize, Transaction } from 'sequelize';
import { isUnderWay } from '../../shared/schemas/runs.ts';
import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import { refreshMarks } from '../decisions/refresh-marks.ts';
import { AppError } from '../errors.ts';
import { closeChunk, findOpenChunk, findOpenChunks, insertChunks } from '../models/run-chunks.ts';
import { hasContours, insertContours } from '../models/run-contours.ts';
import { findFactsText, findRunBoxes } from '../models/run-inputs.ts';
import { insertRunOrders } from '../models/run-orders.ts';
import { insertResults } from '../models/run-results.ts';
import { RunState } from '../models/run-state.ts';
import { Run } from '../models/run.ts';
import { Scheme } from '../models/scheme.ts';
import type { RunQueue } from './run-queue.ts';
import type { RunStep } from './run-step.ts';
import type { RunThreads } from './run-threads.ts';

/** What steps are done with. */
export type StepTools = {
  readonly database: Sequelize;
  readonly threads: Pick<RunThreads, 'compute'>;
  readonly queue: Pick<RunQueue, 'send'>;
};

type StepOf<Kind extends RunStep['kind']> = RunStep & { readonly kind: Kind };

/** Where a run stands, kept from being changed by others until the transaction ends. */
async function lockState(runId: string, transaction: Transaction): Promise<RunState> {
  const state = await RunState.findByPk(runId, { transaction, lock: transaction.LOCK.UPDATE });
  if (state === null) throw new AppError('not-found');
  return state;
}

async function completeIfDone(
  { database, queue }: Pick<StepTools, 'database' | 'queue'>,
  state: RunState,
  transaction: Transaction,
): Promise<void> {
  const { runId } = state;
  if (state.state !== 'running') return;
  if ((await findOpenChunks(database, runId, transaction)).length > 0) return;
  if (!(await hasContours(database, runId, transaction))) return;
  await insertRunOrders(database, runId, transaction);
  await state.update({ state: 'complete', endedAt: new Date() }, { transaction });
  await queue.send([{ kind: 'marks', runId }], transaction);
}

async function plan(tools: StepTools, run: Run): Promise<void> {
  const { database, threads, queue } = tools;
  const buildings = await findRunBoxes(database, run.id);
  const { design } = run;
  const scheme = await Scheme.findByPk(run.schemeId, { rejectOnEmpty: true });
  const { definition } = await crsOfScheme(scheme);
  const chunks = await threads.compute({ kind: 'plan', design, buildings, definition });
  await database.transaction(async (transaction) => {
    const state = await lockState(run.id, transaction);
    if (state.state !== 'planning') return;
    await insertChunks(database, run.id, chunks, transaction);
    await state.update({ state: 'running' }, { transaction });
    const steps = chunks.map((_, chunk) => ({ kind: 'chunk', runId: run.id, chunk }) as const);
    await queue.send(steps, transaction);
    await completeIfDone(tools, state, transaction);
  });
}

async function drawContours(tools: StepTools, run: Run): Promise<void> {
  const { database, threads } = tools;
  const { design, rules } = run;
  const contours = await threads.compute({ kind: 'contours', design, rules });
  await database.transaction(async (transaction) => {
    const state = await lockState(run.id, transaction);
    await insertContours(database, run.id, contours, transaction);
    await completeIfDone(tools, state, transaction);
  });
}

async function workOut(tools: StepTools, run: Run, step: StepOf<'chunk'>): Promise<void> {
  const { database, threads } = tools;
  const chunk = await findOpenChunk(database, step);
  if (chunk === undefined) return;
  const { design, rules } = run;
  const members = await findFactsText(database, run.id, chunk.members);
  const beside = await findFactsText(database, run.id, chunk.beside);
  const results = await threads.compute({ kind: 'chunk', design, rules, members, beside });
  await database.transaction(async (transaction) => {
    const state = await lockState(run.id, transaction);
    if (state.state !== 'running') return;
    if (!(await closeChunk(database, step, transaction))) return;
    await insertResults(database, run.id, results, transaction);
    await completeIfDone(tools, state, transaction);
  });
}

/** Looks which decisions no longer rest on what they did; the run stands, whatever comes of it. */
async function markDecisions({ database }: StepTools, { schemeId }: Run): Promise<void> {
  await database.transaction(async (transaction) => {
    const lock = transaction.LOCK.UPDATE;
    const scheme = await Scheme.findByPk(schemeId, { transaction, lock, rejectOnEmpty: true });
    await refreshMarks(database, scheme, null, transaction);
  });
}

/**
 * Does a step of a run. What was done before, or belongs to a run that has ended, is passed over, so that a
 * step may come twice: each writes all that it finds in one transaction, or nothing.
 */
export async function doStep(tools: StepTools, step: RunStep): Promise<void> {
  const run = await Run.findByPk(step.runId, { rejectOnEmpty: true });
  if (step.kind === 'marks') {
    await markDecisions(tools, run);
    return;
  }
  const { state } = await RunState.findByPk(run.id, { rejectOnEmpty: true });
  if (!isUnderWay(state)) return;
  if (step.kind === 'plan') await plan(tools, run);
  else if (step.kind === 'contours') await drawContours(tools, run);
  else await workOut(tools, run, step);
}

/** Ends a run that cannot go on, and says why. */
export async function failRun(database: Sequelize, runId: string, fault: string): Promise<void> {
  await database.transaction(async (transaction) => {
    const state = await lockState(runId, transaction);
    if (isUnderWay(state.state))
      await state.update({ state: 'failed', endedAt: new Date(), fault }, { transaction });
  });
}
