import { isUnderWay } from '../../shared/schemas/runs.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockRun } from './lock-run.ts';
import { recordChange } from './record-change.ts';

/** Stops a run; what it has worked out stays, so that it can go on. One that has ended stays as it is. */
export async function cancelRun(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  runId: string,
): Promise<void> {
  await database.transaction(async (transaction) => {
    const state = await lockRun(scheme, runId, transaction);
    if (!isUnderWay(state.state)) return;
    await state.update({ state: 'cancelled', endedAt: new Date() }, { transaction });
    const subject = { kind: 'run', id: runId };
    const change = { by, schemeId: scheme.id, action: 'cancel run', subject };
    await recordChange(change, transaction);
  });
}
