import { METHOD_VERSION } from '../../shared/method-version.ts';
import { isUnderWay, RUN_STATES } from '../../shared/schemas/runs.ts';
import { RunState } from '../models/run-state.ts';
import { Run } from '../models/run.ts';
import { failRun } from '../runs/do-step.ts';
import type { Services } from '../services.ts';
import { sendOpenSteps } from './resume-run.ts';

/**
 * Sends anew what a process that died had in hand, at start. Steps that others still have come twice, which
 * does no harm. A run begun by another version of the method cannot go on: its figures would not agree.
 */
export async function recoverRuns(
  services: Pick<Services, 'database' | 'runs' | 'logger'>,
): Promise<void> {
  const { database, logger } = services;
  const open = await RunState.findAll({ where: { state: RUN_STATES.filter(isUnderWay) } });
  for (const { runId } of open) {
    const { methodVersion } = await Run.findByPk(runId, { rejectOnEmpty: true });
    if (methodVersion !== METHOD_VERSION) {
      await failRun(database, runId, 'The method changed while it was under way. Run it again.');
      continue;
    }
    await database.transaction(async (transaction) => {
      const lock = transaction.LOCK.UPDATE;
      const state = await RunState.findByPk(runId, { transaction, lock, rejectOnEmpty: true });
      if (isUnderWay(state.state)) await sendOpenSteps(services, state, transaction);
    });
    logger.info({ runId }, 'a run goes on');
  }
}
