import type { z } from 'zod';
import type { checkDecisionsSchema, decisionsDoneSchema } from '../../shared/schemas/decisions.ts';
import { mayCheck, waitingForCheck } from '../decisions/waiting-for-check.ts';
import { AppError } from '../errors.ts';
import { closeDecisions, refreshStandings } from '../models/decisions.ts';
import { findShownRun } from '../models/find-shown-run.ts';
import { moveDecisionsOn } from '../models/move-decisions-on.ts';
import type { Scheme } from '../models/scheme.ts';
import type { Actor } from '../policies/actor.ts';
import type { Services } from '../services.ts';
import { lockScheme } from './lock-scheme.ts';
import { recordChange } from './record-change.ts';

/**
 * Checks or returns every decision that waits on the buildings that are meant and that somebody else
 * prepared: as many as the person was told, or none.
 */
export async function checkDecisions(
  { database }: Pick<Services, 'database'>,
  by: Actor,
  scheme: Scheme,
  { filter, verdict, comment, expected }: z.infer<typeof checkDecisionsSchema>,
): Promise<z.infer<typeof decisionsDoneSchema>> {
  return database.transaction(async (transaction) => {
    await lockScheme(scheme, transaction);
    const { optionId } = await findShownRun(database, scheme.id, transaction);
    const waiting = await waitingForCheck(database, scheme.id, filter, transaction);
    const open = waiting.filter((decision) => mayCheck(decision, by));
    if (open.length !== expected || optionId === null) {
      const message = `${open.length} decisions wait for you here now, not ${expected}. Look at them again.`;
      throw new AppError('conflict', message);
    }
    const ids = open.map(({ id }) => id);
    await closeDecisions(database, ids, { state: verdict, by: by.id, comment }, transaction);
    const buildings = open.map(({ buildingId }) => buildingId);
    await refreshStandings(database, optionId, buildings, transaction);
    await moveDecisionsOn(scheme, transaction);
    const action = verdict === 'checked' ? 'check decisions' : 'return decisions';
    const subject = { kind: 'decisions', id: ids.length === 1 ? (ids[0] ?? '') : optionId };
    const after = { decisions: ids.length, comment };
    await recordChange({ by, schemeId: scheme.id, action, subject, after }, transaction);
    return { batchId: null, count: ids.length };
  });
}
