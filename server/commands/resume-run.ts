import type { Transaction } from 'sequelize';
import { METHOD_VERSION } from '../../shared/method-version.ts';
import { AppError } from '../errors.ts';
import { findOpenChunks, hasChunks } from '../models/run-chunks.ts';
import { hasContours } from '../models/run-contours.ts';
import type { RunState } from '../models/run-state.ts';
import { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { RunStep } from '../runs/run-step.ts';
import type { Services } from '../services.ts';
import { lockRun } from './lock-run.ts';
import { recordChange } from './record-change.ts';

type Tools = Pick<Services, 'database' | 'runs'>;

/** Sends every step of a run that is still to be done, and says that it goes on. */
export async function sendOpenSteps(
  { database, runs }: Tools,
  state: RunState,
  transaction: Transaction,
): Promise<void> {
  const { runId } = state;
  const isPlanned = await hasChunks(database, runId, transaction);
  const chunks = await findOpenChunks(database, runId, transaction);
  const isDrawn = await hasContours(database, runId, transaction);
  const steps: RunStep[] = [
    ...(isPlanned ? [] : [{ kind: 'plan', runId } as const]),
    ...chunks.map((chunk) => ({ kind: 'chunk', runId, chunk }) as const),
    // whoever comes last looks whether all is done; with nothing left to do, this one
    ...(isDrawn && chunks.length > 0 ? [] : [{ kind: 'contours', runId } as const]),
  ];
  const next = isPlanned ? 'running' : 'planning';
  await state.update({ state: next, endedAt: null, fault: null }, { transaction });
  await runs.send(steps, transaction);
}

/** Goes on with a run that was cancelled or failed, from where it stopped. */
export async function resumeRun(
  tools: Tools,
  by: Actor,
  scheme: Scheme,
  runId: string,
): Promise<void> {
  await tools.database.transaction(async (transaction) => {
    const state = await lockRun(scheme, runId, transaction);
    if (state.state !== 'cancelled' && state.state !== 'failed') return;
    const run = await Run.findByPk(runId, { transaction, rejectOnEmpty: true });
    if (run.methodVersion !== METHOD_VERSION) {
      const message = `This run was begun with version ${run.methodVersion} of the method, and ${METHOD_VERSION} is in use now. Start a new run.`;
      throw new AppError('conflict', message);
    }
    const subject = { kind: 'run', id: runId };
    const change = { by, schemeId: scheme.id, action: 'resume run', subject };
    await recordChange(change, transaction);
    await sendOpenSteps(tools, state, transaction);
  });
}
